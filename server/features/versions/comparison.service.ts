import { compareEntries, compareHeaders } from '#shared/calendar/comparison.js';
import type { Comparison, EntryComparison } from '#shared/contracts/versions.js';
import type { Actor } from '../../http/actor.js';
import type { FrozenContentService } from './frozen-content.service.js';

export class ComparisonService {
  constructor(private readonly contents: FrozenContentService) {}

  /** Both sides of one calendar; either may be the draft, for those who see it. */
  async compare(actor: Actor, calendarId: string, from: string, to: string): Promise<Comparison> {
    const before = await this.contents.read(actor, calendarId, from);
    const after = await this.contents.read(actor, calendarId, to);
    const entries = compareEntries(before.entries, after.entries).map(
      ({ entryId, change, before: was, after: is, fields }): EntryComparison => ({
        entryId,
        change,
        titleOfficer: (is ?? was)?.content.titleOfficer ?? '',
        titleVillage: (is ?? was)?.content.titleVillage ?? '',
        before: was,
        after: is,
        fields,
      }),
    );
    const count = (change: EntryComparison['change']) =>
      entries.filter((entry) => entry.change === change).length;
    return {
      from,
      to,
      year: after.header.year,
      counts: {
        added: count('added'),
        removed: count('removed'),
        changed: count('changed'),
        same: count('same'),
      },
      header: compareHeaders(
        before.header,
        after.header,
        before.entries.map(({ entryId }) => entryId),
        after.entries.map(({ entryId }) => entryId),
      ),
      entries,
    };
  }
}
