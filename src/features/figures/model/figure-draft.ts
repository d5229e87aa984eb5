import { z } from 'zod';
import {
  figureInput,
  type FigureDetail,
  type FigureInput,
  type StartingPoint,
} from '#shared/contracts/figures.js';
import {
  PLAIN_DETAILS,
  SHARING_LEVELS,
  sharingDetails,
  sharingLevel,
  type SharingLevel,
} from '#shared/contracts/sharing.js';
import { PATCH_CLASSES } from '#shared/sky/vocabulary.js';
import { readDeclination, readRightAscension, writeDegrees } from './sky-coordinate.js';

/** A figure as it is being written: numbers that are typed stay the text that was typed. */
const figureDraftSchema = z.object({
  names: z.array(z.object({ tag: z.string(), name: z.string() })),
  story: z.string(),
  variants: z.array(z.object({ toldBy: z.string(), text: z.string() })),
  leads: z.enum(['stars', 'patch']),
  memberHrs: z.array(z.number()),
  indicatorHr: z.number().nullable(),
  rightAscension: z.string(),
  declination: z.string(),
  patchClass: z.enum(PATCH_CLASSES),
  hasOwnDepths: z.boolean(),
  sameSide: z.string(),
  oppositeSide: z.string(),
  sharingLevel,
  sharing: sharingDetails,
  storyLevel: sharingLevel,
  /** False where the story is not this person's to read: it stays as it is. */
  storyShown: z.boolean(),
});
export type FigureDraft = z.infer<typeof figureDraftSchema>;

export function isFigureDraft(value: unknown): value is FigureDraft {
  return figureDraftSchema.safeParse(value).success;
}

/** Fields at which something can stand; lists by their rows, as in `names.1`. */
export type FigureProblems = Readonly<Record<string, string>>;

export type FigureReading = { ok: true; input: FigureInput } | { ok: false; problems: FigureProblems };

export function emptyDraft(languageTags: readonly string[]): FigureDraft {
  return {
    names: [...new Set(languageTags)].map((tag) => ({ tag, name: '' })),
    story: '',
    variants: [],
    leads: 'stars',
    memberHrs: [],
    indicatorHr: null,
    rightAscension: '',
    declination: '',
    patchClass: 'full-night',
    hasOwnDepths: false,
    sameSide: '',
    oppositeSide: '',
    sharingLevel: 'village',
    sharing: PLAIN_DETAILS,
    storyLevel: 'village',
    storyShown: true,
  };
}

/** The saved fields of a figure, without its ids and version. */
export function inputOf(figure: FigureDetail | FigureInput): FigureInput {
  const { names, story, variants, memberHrs, indicatorHr, patch, ownDepths } = figure;
  const { sharingLevel: level, sharing = PLAIN_DETAILS, storyLevel = level } = figure;
  const shared = { sharingLevel: level, sharing, storyLevel };
  return { names, story, variants, memberHrs, indicatorHr, patch, ownDepths, ...shared };
}

export function draftOf(input: FigureInput, storyShown = true): FigureDraft {
  const { patch, ownDepths } = input;
  return {
    names: input.names.map((one) => ({ ...one })),
    story: input.story,
    variants: input.variants.map((one) => ({ ...one })),
    leads: patch === null ? 'stars' : 'patch',
    memberHrs: [...input.memberHrs],
    indicatorHr: input.indicatorHr,
    rightAscension: patch === null ? '' : writeDegrees(patch.rightAscensionDeg),
    declination: patch === null ? '' : writeDegrees(patch.declinationDeg),
    patchClass: patch?.patchClass ?? 'full-night',
    hasOwnDepths: ownDepths !== null,
    sameSide: ownDepths === null ? '' : String(ownDepths.sameSideDeg),
    oppositeSide: ownDepths === null ? '' : String(ownDepths.oppositeSideDeg),
    sharingLevel: input.sharingLevel,
    sharing: input.sharing ?? PLAIN_DETAILS,
    storyLevel: input.storyLevel ?? input.sharingLevel,
    storyShown,
  };
}

/** Everything that was typed as what is sent, or a code for each field that needs a change. */
export function readDraft(draft: FigureDraft): FigureReading {
  const isPatch = draft.leads === 'patch';
  const rightAscensionDeg = readRightAscension(draft.rightAscension);
  const declinationDeg = readDeclination(draft.declination);
  // An empty name of another language is no name, an empty telling none; the first name is asked for.
  const names = filled(draft.names, ({ name }, index) => index === 0 || name.trim() !== '');
  const variants = filled(draft.variants, ({ toldBy, text }) => `${toldBy}${text}`.trim() !== '');
  const candidate = {
    names: names.rows,
    story: draft.story,
    variants: variants.rows,
    memberHrs: draft.memberHrs,
    indicatorHr: isPatch ? null : draft.indicatorHr,
    patch: isPatch
      ? {
          rightAscensionDeg: rightAscensionDeg ?? NaN,
          declinationDeg: declinationDeg ?? NaN,
          patchClass: draft.patchClass,
        }
      : null,
    ownDepths: draft.hasOwnDepths
      ? { sameSideDeg: readNumber(draft.sameSide), oppositeSideDeg: readNumber(draft.oppositeSide) }
      : null,
    sharingLevel: draft.sharingLevel,
    sharing: draft.sharing,
    storyLevel: draft.storyLevel,
  };
  const parsed = figureInput.safeParse(candidate);
  if (parsed.success) return { ok: true, input: parsed.data };
  const problems: Record<string, string> = {};
  const places: Record<string, readonly number[]> = { names: names.places, variants: variants.places };
  for (const { path, message } of parsed.error.issues) {
    const [first, row, ...rest] = path;
    const onScreen = typeof row === 'number' ? (places[String(first)]?.[row] ?? row) : row;
    problems[fieldOf([first, onScreen, ...rest].filter((part) => part !== undefined).map(String))] ??=
      message;
  }
  return { ok: false, problems };
}

/** The field of the form to which a path of the contract belongs; rows of lists stay apart. */
export function fieldOf(path: readonly string[]): string {
  const [first = '', second = ''] = path;
  if (first === 'names' && second === '') return 'names.0';
  return first === 'memberHrs' || second === '' ? first : `${first}.${second}`;
}

/** Rows that say something, and where on the screen each of them stands. */
function filled<T>(
  rows: readonly T[],
  says: (row: T, index: number) => boolean,
): { rows: T[]; places: number[] } {
  const places = rows.flatMap((row, index) => (says(row, index) ? [index] : []));
  return { rows: places.flatMap((index) => rows[index] ?? []), places };
}

function readNumber(typed: string): number {
  const text = typed.trim().replace(',', '.');
  return text === '' ? NaN : Number(text);
}

/** A well-known group as a beginning; names and story stay as they are. */
export function beginWith({ memberHrs, indicatorHr, ownDepths }: StartingPoint): Partial<FigureDraft> {
  return {
    leads: 'stars',
    memberHrs: [...memberHrs],
    indicatorHr,
    hasOwnDepths: ownDepths !== null,
    sameSide: ownDepths === null ? '' : String(ownDepths.sameSideDeg),
    oppositeSide: ownDepths === null ? '' : String(ownDepths.oppositeSideDeg),
  };
}

/** Puts a star in or takes it out. The brightest one leads as long as nobody chose another. */
export function toggleStar(
  draft: FigureDraft,
  hr: number,
  vMagOf: (hr: number) => number,
): Pick<FigureDraft, 'memberHrs' | 'indicatorHr'> {
  const brightest = (hrs: readonly number[]) =>
    [...hrs].sort((a, b) => vMagOf(a) - vMagOf(b) || a - b)[0] ?? null;
  const isIn = draft.memberHrs.includes(hr);
  const memberHrs = isIn ? draft.memberHrs.filter((one) => one !== hr) : [...draft.memberHrs, hr];
  const wasBrightest = draft.indicatorHr === brightest(draft.memberHrs);
  const keeps = !wasBrightest && draft.indicatorHr !== null && memberHrs.includes(draft.indicatorHr);
  return { memberHrs, indicatorHr: keeps ? draft.indicatorHr : brightest(memberHrs) };
}

/** A story reaches as far as its figure, or less far. */
export function narrower(a: SharingLevel, b: SharingLevel): SharingLevel {
  return SHARING_LEVELS.indexOf(a) > SHARING_LEVELS.indexOf(b) ? a : b;
}

/** What two people may have written differently; stars, their leader and a patch are one thing. */
const FIGURE_PARTS = {
  names: ['names'],
  story: ['story'],
  variants: ['variants'],
  sky: ['memberHrs', 'indicatorHr', 'patch'],
  ownDepths: ['ownDepths'],
  sharingLevel: ['sharingLevel', 'sharing', 'storyLevel'],
} as const satisfies Record<string, readonly (keyof FigureInput)[]>;
export type FigurePartName = keyof typeof FIGURE_PARTS;

export function differingParts(a: FigureInput, b: FigureInput): FigurePartName[] {
  return (Object.keys(FIGURE_PARTS) as FigurePartName[]).filter((part) =>
    FIGURE_PARTS[part].some((field) => JSON.stringify(a[field]) !== JSON.stringify(b[field])),
  );
}

/** Their state with the given parts of mine. */
export function joinParts(
  theirs: FigureInput,
  mine: FigureInput,
  parts: readonly FigurePartName[],
): FigureInput {
  const taken = parts
    .flatMap((part): readonly (keyof FigureInput)[] => FIGURE_PARTS[part])
    .map((field) => [field, mine[field]]);
  return { ...theirs, ...(Object.fromEntries(taken) as Partial<FigureInput>) };
}
