import { paths } from '#src/lib/paths.js';

/** The places of the rail, in their order. Another place is one line here, one icon and one word. */
export const RAIL_PLACES = [
  { place: 'today', to: paths.today(), under: ['/'] },
  { place: 'stars', to: paths.stars(), under: ['/stars', '/finder', '/look'] },
  { place: 'calendar', to: paths.calendars(), under: ['/calendars'] },
  { place: 'village', to: paths.village(), under: ['/village', '/places', '/figures'] },
] as const;

export type RailPlace = (typeof RAIL_PLACES)[number]['place'];

/** In which place of the rail an address stands; null for none, the account for instance. */
export function placeOfPath(pathname: string): RailPlace | null {
  const found = RAIL_PLACES.find(({ under }) =>
    under.some((start) => pathname === start || (start !== '/' && pathname.startsWith(`${start}/`))),
  );
  return found?.place ?? null;
}
