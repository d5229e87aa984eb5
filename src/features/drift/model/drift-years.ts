import { FIRST_YEAR, LAST_YEAR, PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';

/** Stretches of years that are offered by name. */
export const STRETCHES = {
  recent: { from: 1000, to: 2100 },
  history: { from: -1000, to: 2100 },
  all: { from: FIRST_YEAR, to: LAST_YEAR },
} as const;
export type Stretch = keyof typeof STRETCHES;

export interface DriftView {
  from: number;
  to: number;
  phenomenon: Phenomenon;
}

/** What an address asks for; what cannot be read falls back to the recent centuries. */
export function readView(search: URLSearchParams): DriftView {
  const from = yearOf(search.get('from')) ?? STRETCHES.recent.from;
  const to = yearOf(search.get('to')) ?? STRETCHES.recent.to;
  const phenomenon = PHENOMENA.find((each) => each === search.get('its')) ?? 'heliacal-rising';
  return from < to ? { from, to, phenomenon } : { ...STRETCHES.recent, phenomenon };
}

/** The offered stretch that these years are; null for others. */
export function stretchOf({ from, to }: Pick<DriftView, 'from' | 'to'>): Stretch | null {
  const names = Object.keys(STRETCHES) as Stretch[];
  return names.find((name) => STRETCHES[name].from === from && STRETCHES[name].to === to) ?? null;
}

function yearOf(text: string | null): number | null {
  if (text === null || !/^-?\d{1,4}$/u.test(text)) return null;
  const year = Number(text);
  return year >= FIRST_YEAR && year <= LAST_YEAR ? year : null;
}
