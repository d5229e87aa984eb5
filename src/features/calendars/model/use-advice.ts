import { useQuery } from '@tanstack/react-query';
import {
  cropClash,
  DRIFT_DAYS_TOLD,
  driftedDays,
  forSamePeople,
  isInCloudySeason,
  lacksSafetyLine,
  markerRange,
  type AdvisedEntry,
  type CropClash,
} from '#shared/calendar/advice.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { DriftEpoch } from '#shared/contracts/drift.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { placesQuery } from '#src/lib/community.js';
import { moonBesideQuery, sinceThenQuery } from '../api/advice-queries.js';
import type { ShownEntry } from './preview-dates.js';
import type { Editor } from './use-editor.js';

/** What to look at besides the days of the entry themselves, with what its sentence names. */
export type Advised =
  | { advice: 'same-people'; others: ShownEntry[]; people: string }
  | { advice: 'crop-not-ripe' | 'crop-long-ripe'; clash: CropClash<Looked> }
  | { advice: 'cloudy-season' }
  | { advice: 'moonlit'; day: string }
  | { advice: 'drifted'; since: number; days: number; markerKey: string }
  | { advice: 'no-safety-line' };

interface Looked extends AdvisedEntry {
  shown: ShownEntry;
}

/** Of the entry that is open: from the others of the draft, from the place, and from the sky. */
export function useAdvice(editor: Editor, entry: ShownEntry): Advised[] {
  const { communityId, placeId, year } = editor.calendar;
  const { data: places } = useQuery(placesQuery(communityId));
  const rainMonths = places?.find(({ id }) => id === placeId)?.rainMonths ?? [];
  const marker = entry.dates?.marker ?? null;
  const moonlitDay = useMoonlitDay(placeId, entry);
  const drift = useDrift(placeId, year, entry);
  const all = editor.shown.map(looked);
  const own = looked(entry);
  const others = forSamePeople(own, all).map(({ shown }) => shown);
  const clash = cropClash(own, all);
  const found: (Advised | false)[] = [
    others.length > 0 && {
      ...{ advice: 'same-people', others },
      people: entry.content.record?.work.responsible ?? '',
    },
    clash !== null && { advice: clash.advice, clash },
    isInCloudySeason(markerRange(marker), rainMonths) && { advice: 'cloudy-season' },
    moonlitDay !== null && { advice: 'moonlit', day: moonlitDay },
    drift !== null && { advice: 'drifted', ...drift },
    lacksSafetyLine(entry) && { advice: 'no-safety-line' },
  ];
  return found.filter((one) => one !== false);
}

function looked(shown: ShownEntry): Looked {
  return { id: shown.id, content: shown.content, window: shown.dates?.window ?? null, shown };
}

/** The expected day of the leading star, where a bright Moon stands near it then. */
function useMoonlitDay(placeId: string, entry: ShownEntry): string | null {
  const { content, dates, saved } = entry;
  const { lead } = content;
  const isSaved = saved !== null && sameJson(saved.content.lead, lead);
  const day = dates?.marker?.expected.gregorian ?? null;
  const star = isStarLead(lead) && day !== null ? { ...starOf(lead), date: day } : null;
  const { data: moon } = useQuery({
    ...moonBesideQuery(placeId, star ?? NO_STAR),
    enabled: star !== null && !isSaved,
  });
  // Of what is saved the list has said it already.
  const isMoonlit = isSaved ? (saved.advice ?? []).includes('moonlit') : moon?.moonlight === 'strong';
  return star !== null && isMoonlit ? day : null;
}

const NO_STAR = { markerKey: '', phenomenon: 'heliacal-rising', date: '' } as const;

function starOf({ markerKey, phenomenon }: { markerKey: string; phenomenon: Phenomenon }) {
  return { markerKey, phenomenon };
}

/** By how many days the leading star moved since people began to go by it, where that is more than three. */
function useDrift(
  placeId: string,
  year: number,
  { content: { lead, record } }: ShownEntry,
): { since: number; days: number; markerKey: string } | null {
  const since = record?.trust.sinceYear ?? null;
  const star = isStarLead(lead) && since !== null && since < year ? lead : null;
  const { data: epochs } = useQuery({
    ...sinceThenQuery(placeId, star?.markerKey ?? '', since ?? 0, year),
    enabled: star !== null,
  });
  if (star === null || since === null || epochs === undefined) return null;
  const then = dayIn(epochs, since, star.phenomenon);
  const now = dayIn(epochs, year, star.phenomenon);
  if (then === null || now === null) return null;
  const days = driftedDays(then, now);
  return Math.abs(days) > DRIFT_DAYS_TOLD ? { since, days, markerKey: star.markerKey } : null;
}

function dayIn(epochs: readonly DriftEpoch[], year: number, phenomenon: Phenomenon): string | null {
  const epoch = epochs.find((one) => one.year === year);
  return epoch?.phenomena[phenomenon].occurrences[0]?.expected.gregorian ?? null;
}
