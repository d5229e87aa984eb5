import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import type { RangeMark } from '#src/ui/pictures/ring-row.js';
import type { BoardLane } from '#src/ui/pictures/year-board.js';
import { listWords } from './list-words.js';
import type { NamesByKey } from './marker-names.js';
import { useMarkerDayWords } from './marker-day-words.js';
import { useSkySignWords } from './sky-sign-words.js';
import { endOfLead } from './sky-words.js';

interface LedByIt {
  content: Pick<EntryInput, 'lead'>;
  dates: EntryDates | null;
}

interface SignLane {
  key: string;
  spec: SkyMarkerSpec;
  marks: RangeMark[];
  days: NonNullable<EntryDates['marker']>[];
}

/** Signs of the sky that entries go by, each once with the days that they take from it, in the entries' order. */
export function signLanesOf(entries: readonly LedByIt[]): SignLane[] {
  const lanes = new Map<string, SignLane>();
  for (const { content, dates } of entries) {
    const { lead } = content;
    if (lead.type !== 'sky') continue;
    const key = canonicalJson(lead.spec);
    const lane = lanes.get(key) ?? { key, spec: lead.spec, marks: [], days: [] };
    lanes.set(key, lane);
    const days = dates?.marker;
    if (!days || lane.marks.some(({ expected }) => expected === days.expected.dayNumber)) continue;
    lane.days.push(days);
    lane.marks.push({
      key: String(days.expected.dayNumber),
      early: days.early?.dayNumber ?? null,
      expected: days.expected.dayNumber,
      late: days.late?.dayNumber ?? null,
      side: endOfLead(lead),
    });
  }
  return [...lanes.values()];
}

/** The same as lanes of the year's board: single days instead of states. Needs the texts `calendars` and `sky`. */
export function useSignLanes(entries: readonly LedByIt[], markers: NamesByKey): BoardLane[] {
  const { t, i18n } = useTranslation('calendars');
  const sign = useSkySignWords();
  const words = useMarkerDayWords();
  return useMemo(
    () =>
      signLanesOf(entries).map(({ key, spec, marks, days }) => {
        const name = sign(spec, markers);
        return {
          key,
          name,
          icon: <SignIcon sign={skySignIconKey(spec)} size={20} />,
          marks,
          label: t(days.length === 0 ? 'strip.signLaneEmpty' : 'strip.signLane', {
            sign: name,
            days: listWords(days.map(words.about), i18n.language),
          }),
        };
      }),
    [entries, markers, sign, words, t, i18n.language],
  );
}
