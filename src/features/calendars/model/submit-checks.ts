import type { Community } from '#shared/contracts/people.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import type { ShownEntry } from './preview-dates.js';

/** What keeps a draft from being submitted. */
export type Missing = 'no-entries' | 'no-weather' | 'no-agriculture' | 'already-out';

export interface SubmitChecks {
  missing: Missing[];
  /** Written and not saved: the submission would take what was saved last. */
  unsaved: ShownEntry[];
  /** With something to look at; it does not keep them from being submitted. */
  remarked: ShownEntry[];
  /** Farm work that does not say what to do if it is late. */
  withoutLate: ShownEntry[];
  entryCount: number;
  markerCount: number;
}

export function submitChecks(
  shown: readonly ShownEntry[],
  community: Pick<Community, 'weatherContact' | 'agricultureContact'> | null,
  outNumber: number | null,
): SubmitChecks {
  const saved = shown.flatMap((entry) => (entry.saved ? [{ ...entry, saved: entry.saved }] : []));
  const missing: Missing[] = [];
  if (outNumber !== null) missing.push('already-out');
  if (saved.length === 0) missing.push('no-entries');
  if (community?.weatherContact === '') missing.push('no-weather');
  if (community?.agricultureContact === '') missing.push('no-agriculture');
  const markers = new Set(
    saved.flatMap(({ saved: { content } }) =>
      content.lead.type === 'fixed-date'
        ? []
        : content.lead.type === 'marker'
          ? [content.lead.markerKey]
          : [canonicalJson(content.lead.spec)],
    ),
  );
  return {
    missing,
    unsaved: shown.filter((entry) => entry.unsaved),
    remarked: saved.filter((entry) => entry.saved.dates.warnings.length > 0),
    withoutLate: saved.filter(({ saved: { content } }) => content.kind === 'farm' && content.ifLate === ''),
    entryCount: saved.length,
    markerCount: markers.size,
  };
}
