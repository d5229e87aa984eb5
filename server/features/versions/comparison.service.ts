import { compareEntries, compareHeaders } from '#shared/calendar/comparison.js';
import type {
  Comparison,
  EntryComparison,
  VersionEntryBody,
  VersionHeader,
} from '#shared/contracts/versions.js';
import type { Actor } from '../../http/actor.js';
import type { FrozenContentService } from './frozen-content.service.js';
import type { MovedSide, WhyMovedService } from './why-moved.service.js';

export class ComparisonService {
  constructor(
    private readonly contents: FrozenContentService,
    private readonly reasons: WhyMovedService,
  ) {}

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
        ...this.why(before.header, was, after.header, is),
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

  private why(
    headerBefore: VersionHeader,
    before: VersionEntryBody | null,
    headerAfter: VersionHeader,
    after: VersionEntryBody | null,
  ): Pick<EntryComparison, 'why'> {
    if (before === null || after === null) return {};
    const why = this.reasons.of(sideOf(headerBefore, before), sideOf(headerAfter, after));
    return why === null ? {} : { why };
  }
}

function sideOf({ year, place, engineVersion }: VersionHeader, body: VersionEntryBody): MovedSide {
  return { year, place, engineVersion, timing: body.content, dates: body.dates };
}
