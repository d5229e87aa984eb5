import { z } from 'zod';
import { PATCH_CLASSES } from '../sky/vocabulary.js';
import { id, instant, line, listOf, rowVersion, text } from './common.js';
import { defineEndpoint, member, signedIn } from './endpoint.js';
import { languageTag, ROLES } from './people.js';
import { groupFitsLevel, PLAIN_DETAILS, SHARING_LEVELS, sharingDetails, sharingLevel } from './sharing.js';
import { markerKey } from './stars.js';

export const FIGURE_NAME_MAX = 80;
export const FIGURE_NAMES_MAX = 8;
export const FIGURE_STORY_MAX = 6000;
export const FIGURE_VARIANTS_MAX = 8;
export const FIGURE_VARIANT_MAX = 2000;
export const FIGURE_MEMBERS_MAX = 40;
export const FIGURES_MAX = 100;
/** Needed depths of the Sun: no published value for the naked eye lies outside. */
export const FIGURE_DEPTH_MIN_DEG = 4;
export const FIGURE_DEPTH_MAX_DEG = 25;

const figureName = z.strictObject({ tag: languageTag, name: line(FIGURE_NAME_MAX, 1) });
export type FigureName = z.infer<typeof figureName>;

const figureVariant = z.strictObject({
  /** As the person wishes to be called; empty where nobody is to be named. */
  toldBy: line(80),
  text: text(FIGURE_VARIANT_MAX).pipe(z.string().min(1, 'required')),
});
export type FigureVariant = z.infer<typeof figureVariant>;

const hr = z.number().int().min(1).max(9999);
const depthDeg = z
  .number('not-a-number')
  .min(FIGURE_DEPTH_MIN_DEG, 'depth-range')
  .max(FIGURE_DEPTH_MAX_DEG, 'depth-range');

export const patchInput = z.strictObject({
  /** J2000, degrees. */
  rightAscensionDeg: z
    .number('not-a-number')
    .min(0, 'right-ascension-range')
    .max(360, 'right-ascension-range'),
  declinationDeg: z.number('not-a-number').min(-90, 'declination-range').max(90, 'declination-range'),
  patchClass: z.enum(PATCH_CLASSES),
});

const figureFields = z.strictObject({
  /** The first one is the village's own word for it; each language once. */
  names: z
    .array(figureName)
    .min(1, 'required')
    .max(FIGURE_NAMES_MAX)
    .refine((names) => new Set(names.map(({ tag }) => tag)).size === names.length, 'no-duplicates'),
  story: text(FIGURE_STORY_MAX),
  variants: z.array(figureVariant).max(FIGURE_VARIANTS_MAX),
  memberHrs: z
    .array(hr)
    .max(FIGURE_MEMBERS_MAX, 'too-many-stars')
    .refine((hrs) => new Set(hrs).size === hrs.length, 'no-duplicates'),
  /** The star whose dates are the figure's; null for a patch of sky. */
  indicatorHr: hr.nullable(),
  /** Null for a group of stars. */
  patch: patchInput.nullable(),
  /** Depths of the village's own instead of those of brightness or class. */
  ownDepths: z.strictObject({ sameSideDeg: depthDeg, oppositeSideDeg: depthDeg }).nullable(),
  sharingLevel,
  /** Beside the level, for figure and story alike. */
  sharing: sharingDetails.optional(),
  /** Of story and variants: never wider than the figure; left out where it is the figure's. */
  storyLevel: sharingLevel.optional(),
});

type FigureFields = z.infer<typeof figureFields>;

/** A group has stars and one of them leads; a patch has a place and may name stars near it. */
function leadIsClear(
  { memberHrs, indicatorHr, patch }: Pick<FigureFields, 'memberHrs' | 'indicatorHr' | 'patch'>,
  context: z.RefinementCtx,
): void {
  const refuse = (field: string, message: string) => {
    context.addIssue({ code: 'custom', path: [field], message });
  };
  if (patch !== null) {
    if (indicatorHr !== null) refuse('indicatorHr', 'star-or-patch');
  } else if (memberHrs.length === 0) refuse('memberHrs', 'choose-stars');
  else if (indicatorHr === null || !memberHrs.includes(indicatorHr)) refuse('indicatorHr', 'leading-star');
}

/** A group level names its group; a story is as narrow as its figure, or narrower. */
function levelsFit(
  {
    sharingLevel: level,
    sharing,
    storyLevel = level,
  }: Pick<FigureFields, 'sharingLevel' | 'sharing' | 'storyLevel'>,
  context: z.RefinementCtx,
): void {
  const { groupId } = sharing ?? PLAIN_DETAILS;
  const hasGroup = level === 'group' || storyLevel === 'group';
  groupFitsLevel({ level: hasGroup ? 'group' : level, groupId }, (message) => {
    context.addIssue({ code: 'custom', path: ['sharing', 'groupId'], message });
  });
  if (SHARING_LEVELS.indexOf(storyLevel) < SHARING_LEVELS.indexOf(level)) {
    context.addIssue({ code: 'custom', path: ['storyLevel'], message: 'story-wider-than-figure' });
  }
}

export const figureInput = figureFields.superRefine(leadIsClear).superRefine(levelsFit);
export type FigureInput = z.infer<typeof figureInput>;

export const figureUpdate = figureFields
  .extend({ version: rowVersion })
  .superRefine(leadIsClear)
  .superRefine(levelsFit);
export type FigureUpdate = z.infer<typeof figureUpdate>;

/** An entry of a draft that goes by a figure. Drafts are for officers, elders and stewards. */
export const figureUse = z.strictObject({
  calendarId: id,
  entryId: id,
  placeName: z.string(),
  year: z.number().int(),
  title: z.string(),
});
export type FigureUse = z.infer<typeof figureUse>;

export const figure = figureFields.extend({
  id,
  communityId: id,
  /** By this it stands in the table of stars. */
  markerKey,
  updatedBy: z.string(),
  updatedAt: instant,
  version: rowVersion,
  /** False where story and variants are kept by their people; they are empty then. */
  storyShown: z.boolean(),
});
export type Figure = z.infer<typeof figure>;

export const figureDetail = figure.extend({ usedBy: z.array(figureUse) });
export type FigureDetail = z.infer<typeof figureDetail>;

/** A star as somebody picks it: where it stands (J2000), how bright it is, how it is called. */
export const chartStar = z.strictObject({
  hr: z.number().int(),
  name: z.string(),
  designation: z.string(),
  rightAscensionDeg: z.number(),
  declinationDeg: z.number(),
  vMag: z.number(),
});
export type ChartStar = z.infer<typeof chartStar>;

/** A well-known group to begin from. */
export const startingPoint = z.strictObject({
  key: z.string(),
  name: z.string(),
  memberHrs: z.array(z.number().int()),
  indicatorHr: z.number().int(),
  ownDepths: z.strictObject({ sameSideDeg: z.number(), oppositeSideDeg: z.number() }).nullable(),
});
export type StartingPoint = z.infer<typeof startingPoint>;

export const chart = z.strictObject({ stars: z.array(chartStar), startingPoints: z.array(startingPoint) });
export type Chart = z.infer<typeof chart>;

const communityParams = z.strictObject({ communityId: id });
const figureParams = z.strictObject({ communityId: id, figureId: id });

export const figuresEndpoints = {
  list: defineEndpoint({
    id: 'listFigures',
    method: 'GET',
    path: '/api/communities/:communityId/figures',
    summary: 'The village’s own figures, by name',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(figure),
  }),
  create: defineEndpoint({
    id: 'createFigure',
    method: 'POST',
    path: '/api/communities/:communityId/figures',
    summary: 'Add a figure of the village',
    access: member('community', 'officer'),
    params: communityParams,
    body: figureInput,
    response: figureDetail,
    status: 201,
  }),
  read: defineEndpoint({
    id: 'readFigure',
    method: 'GET',
    path: '/api/communities/:communityId/figures/:figureId',
    summary: 'One figure with its story, and the draft entries that go by it for those who see drafts',
    access: member('community', ...ROLES),
    params: figureParams,
    response: figureDetail,
  }),
  update: defineEndpoint({
    id: 'updateFigure',
    method: 'PUT',
    path: '/api/communities/:communityId/figures/:figureId',
    summary: 'Change a figure; published versions keep its name and dates; 409 with both states when stale',
    access: member('community', 'officer'),
    params: figureParams,
    body: figureUpdate,
    response: figureDetail,
  }),
  remove: defineEndpoint({
    id: 'removeFigure',
    method: 'DELETE',
    path: '/api/communities/:communityId/figures/:figureId',
    summary: 'Take a figure out; refused while an entry of a draft goes by it; it can be put back',
    access: member('community', 'officer'),
    params: figureParams,
  }),
  restore: defineEndpoint({
    id: 'restoreFigure',
    method: 'POST',
    path: '/api/communities/:communityId/figures/:figureId/restore',
    summary: 'Put a figure back that was taken out',
    access: member('community', 'officer'),
    params: figureParams,
    response: figureDetail,
  }),
  chart: defineEndpoint({
    id: 'readChart',
    method: 'GET',
    path: '/api/chart',
    summary: 'Places of the stars of the table (J2000) and well-known groups to begin from',
    access: signedIn,
    response: chart,
  }),
} as const;
