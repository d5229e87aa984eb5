import {
  CONSENTS,
  isOfCircle,
  LEVELS,
  PEOPLE,
  SEASONS,
  type Combination,
  type Level,
  type Season,
  type Someone,
} from './visibility-rules.js';
import { holds, type PlantedKind } from './what-answers-hold.js';

/** Whether an endpoint told somebody of a thing: by the rules, or as a test has seen it. */
export type Told = (
  endpointId: string,
  person: Someone,
  thing: Combination & { kind: PlantedKind },
) => boolean;

const BEGIN = '<!-- visibility:begin -->';
const END = '<!-- visibility:end -->';

/** The guide's text with both tables of today between their marks. */
export function withVisibilityTables(guide: string, told: Told = holds): string {
  const [before, after] = [guide.split(BEGIN), guide.split(END)];
  if (before.length !== 2 || after.length !== 2)
    throw new Error(`The guide must hold ${BEGIN} and ${END} once.`);
  const tables = `${peopleTable(told)}\n\n${CHANNEL_LEGEND}\n\n${channelTable(told)}`;
  return `${before[0] ?? ''}${BEGIN}\n\n${tables}\n\n${END}${after[1] ?? ''}`;
}

const SEASON_WORDS: Readonly<Record<Season, string>> = {
  none: '–',
  inside: 'in its telling season',
  outside: 'outside it',
};

/** Level × telling season × consent against people; what was agreed stands in one row where it makes no difference. */
function peopleTable(told: Told): string {
  const rows = LEVELS.flatMap((level) => SEASONS.flatMap((season) => rowsOf(level, season, told)));
  return table([['level', 'telling season', 'what was agreed', ...PEOPLE], ...rows]);
}

function rowsOf(level: Level, season: Season, told: Told): string[][] {
  const byMarks = new Map<string, string[]>();
  for (const consent of CONSENTS) {
    const marks = PEOPLE.map((person) =>
      told('readVersion', person, { kind: 'entry', level, season, consent }) ? '●' : '–',
    ).join(' | ');
    byMarks.set(marks, [...(byMarks.get(marks) ?? []), consent]);
  }
  return [...byMarks].map(([marks, consents]) => [level, SEASON_WORDS[season], consents.join(', '), marks]);
}

const CHANNEL_LEGEND =
  'What carries it: ● to all of the level’s people, ◐ to some of them, – to nobody. Levels are asked without a telling ' +
  'season where nobody was asked for consent; consents are asked at the village’s level.';

/** Each way on which things go out, by the thing that goes on it. */
const CHANNELS: readonly (readonly [string, PlantedKind, string])[] = [
  ['published version', 'entry', 'readVersion'],
  ['draft', 'entry', 'listEntries'],
  ['comparison', 'entry', 'compareVersions'],
  ['board as PDF', 'entry', 'printSheet'],
  ['board on the screen', 'entry', 'previewSheet'],
  ['Today', 'entry', 'readToday'],
  ['records', 'entry', 'listAuditEvents'],
  ['its name, to bring it back', 'entry', 'listPausedItems'],
  ['its name in the register of consents', 'entry', 'listConsents'],
  ['figures', 'figure', 'listFigures'],
  ['one figure', 'figure', 'readFigure'],
  ['table of stars', 'figure', 'listStars'],
  ['table of stars as CSV', 'figure', 'exportStarsCsv'],
  ['finder', 'figure', 'findMarkers'],
  ['recordings of an entry', 'recording', 'listAttachments'],
  ['voice', 'sound', 'readAttachmentPart'],
  ['picture', 'picture', 'readAttachmentPart'],
  ['small picture', 'thumbnail', 'readAttachmentThumbnail'],
  ['notes', 'note', 'listNotes'],
];

function channelTable(told: Told): string {
  const rows = CHANNELS.map(([name, kind, endpointId]) => {
    const markOf = (thing: Combination) => {
      const people = PEOPLE.filter((person) => isOfCircle(person, thing));
      const reached = people.filter((person) => told(endpointId, person, { kind, ...thing }));
      return reached.length === 0 ? '–' : reached.length === people.length ? '●' : '◐';
    };
    return [
      name,
      ...LEVELS.map((level) => markOf({ level, season: 'none', consent: 'nobody asked' })),
      ...CONSENTS.slice(1).map((consent) => markOf({ level: 'village', season: 'none', consent })),
    ];
  });
  return table([['channel', ...LEVELS, ...CONSENTS.slice(1)], ...rows]);
}

function table([head = [], ...rows]: readonly (readonly string[])[]): string {
  return [head, head.map(() => '---'), ...rows].map((cells) => `| ${cells.join(' | ')} |`).join('\n');
}
