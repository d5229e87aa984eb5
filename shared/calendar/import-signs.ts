import type { Phenomenon, SkyMarkerKind, SunSeason } from '#shared/sky/index.js';
import type { PlannedDay } from './entry-model.js';
import type { SaidPhrase } from './import-phrases.js';

/** A sign that a cell names, as the village knows it. */
export type NamedSign =
  | { type: 'star'; markerKey: string; phenomenon: Phenomenon }
  /** A spec as far as its words go; whoever takes it holds it against the limits of the contracts. */
  | { type: 'sky'; spec: SpokenSpec; occurrence: number }
  /** Something that grows, flies or blows. */
  | { type: 'nature'; name: string }
  /** Another entry, by its title or its number in the table, and which of its days. */
  | { type: 'entry'; name: string; day: PlannedDay | 'actual' };

export interface SpokenSpec {
  kind: SkyMarkerKind;
  [member: string]: unknown;
}

export type ImportSignProblem =
  'unknown-sign-words' | 'unknown-star-name' | 'which-season' | 'direction-missing';

export interface SignFacts {
  /** Stars and figures by their names, as they are compared. */
  markerKeyOf: (name: string) => string | undefined;
  phenomenonOf: (name: string) => Phenomenon | undefined;
  /** Spring comes in March on one side of the Earth and in September on the other; null where neither is meant. */
  latitudeDeg: number;
}

/** Nearer to the equator than the Sun ever stands overhead, nobody's spring is meant without saying which. */
const TROPIC_DEG = 23.44;

const NORTHERN: Readonly<Record<string, SunSeason>> = {
  spring: 'march-equinox',
  summer: 'june-solstice',
  autumn: 'september-equinox',
  winter: 'december-solstice',
};
const SOUTHERN: Readonly<Record<string, SunSeason>> = {
  spring: 'september-equinox',
  summer: 'december-solstice',
  autumn: 'march-equinox',
  winter: 'june-solstice',
};

/** Members of a spec that the words of a phrase stand for, by where the phrase stands: `due-meridian`, `south`. */
type Member =
  | 'twilight'
  | 'side'
  | 'clock'
  | 'facing'
  | 'position'
  | 'season'
  | 'event'
  | 'passage'
  | 'end'
  | 'depthDeg'
  | 'appearance';
const MEMBERS: Readonly<Record<string, readonly Member[]>> = {
  culmination: ['twilight'],
  'star-altitude': ['side', 'clock'],
  'due-meridian': ['facing'],
  'about-pole': ['position'],
  'sun-season': ['season'],
  'sun-azimuth': ['event'],
  'noon-sun': ['passage'],
  'zenith-sun': [],
  'dark-night': ['end', 'depthDeg'],
  'moon-phase': ['event'],
  'moon-counted': ['event'],
  'venus-appearance': ['appearance'],
};

/** What a phrase comes to at a place, or what is the matter with it. */
export function signOfPhrase(
  { path, holes }: SaidPhrase,
  facts: SignFacts,
): NamedSign | { problem: ImportSignProblem } {
  const [head = '', second = ''] = path;
  if (head === 'entry')
    return { type: 'entry', name: holes.entry ?? '', day: second as PlannedDay | 'actual' };
  if (head === 'nature') return { type: 'nature', name: holes.name ?? '' };
  if (head === 'season') return season(second, facts.latitudeDeg);
  const members = MEMBERS[head];
  if (members === undefined) return { problem: 'unknown-sign-words' };
  const said: Partial<Record<Member, string>> = Object.fromEntries(
    members.map((member, index) => [member, path[index + 1]]),
  );
  const kind = head as SkyMarkerKind;
  const star = holes.star === undefined ? undefined : facts.markerKeyOf(holes.star);
  if (holes.star !== undefined && star === undefined) return { problem: 'unknown-star-name' };
  const spec: SpokenSpec = { kind, ...(star !== undefined && { markerKey: star }) };
  switch (kind) {
    case 'culmination':
      return sky({ ...spec, twilight: said.twilight, depthDeg: figure(holes.depth) });
    case 'star-altitude': {
      const at =
        said.clock === 'solar-hour'
          ? { clock: said.clock, solarHour: hour(holes.hour) }
          : { clock: said.clock, minutes: figure(holes.count) };
      return sky({ ...spec, altitudeDeg: figure(holes.altitude), side: said.side, at });
    }
    case 'due-meridian':
    case 'about-pole':
      return sky({ ...spec, ...said, solarHour: hour(holes.hour) });
    case 'sun-azimuth':
      if (holes.azimuth === undefined) return { problem: 'direction-missing' };
      return sky({ ...spec, ...said, azimuthDeg: figure(holes.azimuth), pointName: holes.point ?? '' });
    case 'noon-sun':
      return sky({ ...spec, ...said, ridgeName: holes.ridge ?? '' });
    case 'dark-night':
      return sky({ ...spec, end: said.end, depthDeg: figure(holes.depth ?? said.depthDeg) });
    case 'moon-phase':
      return sky({ ...spec, ...said }, figure(holes.number ?? '1'));
    case 'moon-counted': {
      const phenomenon = facts.phenomenonOf(holes.phenomenon ?? '');
      if (phenomenon === undefined) return { problem: 'unknown-sign-words' };
      return sky({ ...spec, ...said, phenomenon, count: figure(holes.number) });
    }
    default:
      return sky({ ...spec, ...said });
  }
}

function sky(spec: SpokenSpec, occurrence = 1): NamedSign {
  return { type: 'sky', spec, occurrence };
}

function season(name: string, latitudeDeg: number): NamedSign | { problem: ImportSignProblem } {
  if (Math.abs(latitudeDeg) < TROPIC_DEG) return { problem: 'which-season' };
  return sky({ kind: 'sun-season', season: (latitudeDeg > 0 ? NORTHERN : SOUTHERN)[name] });
}

function figure(text: string | undefined): number {
  return Number((text ?? '').replace(',', '.'));
}

/** `21`, `21:15` and `21.15` as hours by the Sun. */
function hour(text: string | undefined): number {
  const [hours = '', minutes = '0'] = (text ?? '').split(/[:.]/u);
  return Number(hours) + Number(minutes) / 60;
}
