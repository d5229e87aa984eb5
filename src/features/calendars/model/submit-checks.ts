import { isStarLead } from '#shared/calendar/entry-model.js';
import { signOffNeeds, type SignOffNeed } from '#shared/calendar/sign-off-needs.js';
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
  /** That do not say everything yet: the server refuses a submission with them. */
  incomplete: { entry: ShownEntry; needs: SignOffNeed[] }[];
  /** Written before there were records: they go out as they are. */
  withoutRecord: ShownEntry[];
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
      isStarLead(content.lead)
        ? [content.lead.markerKey]
        : content.lead.type === 'sky'
          ? [canonicalJson(content.lead.spec)]
          : [],
    ),
  );
  return {
    missing,
    unsaved: shown.filter((entry) => entry.unsaved),
    remarked: saved.filter((entry) => entry.saved.dates.warnings.length > 0),
    withoutLate: saved.filter(({ saved: { content } }) => content.kind === 'farm' && content.ifLate === ''),
    incomplete: saved
      .map((entry) => ({ entry, needs: signOffNeeds(entry.saved.content, entry.saved.isOlder) }))
      .filter(({ needs }) => needs.length > 0),
    withoutRecord: saved.filter(({ saved }) => saved.isOlder === true && saved.content.record === undefined),
    entryCount: saved.length,
    markerCount: markers.size,
  };
}
