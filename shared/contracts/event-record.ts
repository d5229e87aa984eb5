import { z } from 'zod';
import { FIRST_YEAR, LAST_YEAR } from '../sky/vocabulary.js';
import { id, isoDate, line, monthDay, text } from './common.js';
import { villageWord } from './village-word.js';

export const RECORD_SIGNS_MAX = 12;
export const LEAD_DAYS_MAX = 120;
export const CROP_DAYS_MAX = 1500;
export const REPEAT_YEARS_MAX = 50;

/** A small neutral list of work; `other` is named in the village's own words. */
export const OPERATIONS = [
  'clear-land',
  'manure',
  'plough',
  'mend-walls',
  'test-seed',
  'nursery',
  'sow',
  'plant',
  'gap-fill',
  'thin',
  'weed',
  'top-dress',
  'earth-up',
  'water',
  'guard',
  'pest-check',
  'harvest',
  'dry',
  'thresh',
  'store',
  'seed-back',
  'fallow',
  'graze',
  'burn',
  'move-herd',
  'fish',
  'gather',
  'rest',
  'other',
] as const;
export type Operation = (typeof OPERATIONS)[number];

export const RECORD_SIGN_TYPES = [
  'bird',
  'plant',
  'insect',
  'animal',
  'wind',
  'cloud',
  'water',
  'soil',
  'ice',
  'star-look',
  'moon',
  'human',
] as const;
export type RecordSignType = (typeof RECORD_SIGN_TYPES)[number];

export const STILL_SEEN = ['yes', 'seldom', 'no'] as const;
export const REPEATS = ['yearly', 'every-n-years', 'some-years'] as const;
/** Words, never numbers: how sure its giver is. */
export const CONFIDENCES = ['strong', 'fair', 'weak', 'being-tried'] as const;
/** What it rests on. */
export const BASES = ['handed-down', 'own-years', 'recorded', 'trial'] as const;

function wholeDays(max: number) {
  return z.number('not-a-number').int('whole-days').min(0, 'days-range').max(max, 'days-range').nullable();
}

/** What is said of a sign: in an entry's own words, or in those of the village's list. */
export const signWords = z.strictObject({
  type: z.enum(RECORD_SIGN_TYPES),
  /** How people call it. */
  name: line(80, 1),
  /** What exactly to look for. */
  look: text(300),
  where: line(120),
  usual: z.strictObject({ from: monthDay, to: monthDay }).nullable(),
  stillSeen: z.enum(STILL_SEEN).nullable(),
});

/**
 * A sign to look out for before the work begins. One of the village's list is named, and its words stand beside; one in
 * the entry's own words has an id of its own once it was saved, so that it can be marked as seen.
 */
export const recordSign = signWords.extend({ sharedId: id.optional(), ownId: id.optional() });
export type RecordSign = z.infer<typeof recordSign>;

/** Who of which office read a text and let it stand, and when. */
export const textCheck = z.strictObject({ office: line(120, 1), name: line(120, 1), day: isoDate });
export type TextCheck = z.infer<typeof textCheck>;

const recordFields = z.strictObject({
  what: z.strictObject({
    operation: z.enum(OPERATIONS).nullable(),
    /** What `other` is. */
    ownOperation: line(80),
    /** What the village calls this work; left out where it keeps the usual name. */
    operationWord: villageWord.optional(),
    /** From sowing to harvest, as long as its people know it. */
    variety: z.strictObject({
      name: line(80),
      fromDays: wholeDays(CROP_DAYS_MAX),
      toDays: wholeDays(CROP_DAYS_MAX),
    }),
    /** Kind of land, terrace, zone. */
    land: line(200),
  }),
  when: z.strictObject({
    /** Before its earliest day: "get ready". */
    leadDays: wholeDays(LEAD_DAYS_MAX),
    graceDays: wholeDays(LEAD_DAYS_MAX),
    repeats: z.enum(REPEATS),
    everyYears: z
      .number('not-a-number')
      .int('years-apart')
      .min(2, 'years-apart')
      .max(REPEAT_YEARS_MAX, 'years-apart')
      .nullable(),
    /** In which years, where it is not every year: "not in a drought year". */
    rule: line(300),
  }),
  signs: z.strictObject({
    list: z.array(recordSign).max(RECORD_SIGNS_MAX, 'too-many-signs'),
    /** How many of them people wait for. */
    needed: z.number('not-a-number').int().min(1, 'signs-needed').nullable(),
    /** Place in the list of the one without which nothing begins. */
    mustHave: z.number().int().min(0).nullable(),
  }),
  work: z.strictObject({
    responsible: line(120),
    helpers: line(200),
    decides: line(120),
    /** Who owns seed, tools, animals. */
    owns: line(120),
    inputs: text(500),
    ifEarly: text(500),
    /** After the first step, which is the entry's own text for being late. */
    ifLaterStill: text(500),
    stop: z.strictObject({ date: monthDay, source: line(200, 1) }).nullable(),
    askWhom: line(200),
  }),
  trust: z.strictObject({
    confidence: z.enum(CONFIDENCES).nullable(),
    by: line(120),
    basis: z.enum(BASES).nullable(),
    /** Since about which year people go by it; left out where nobody says. */
    sinceYear: z
      .number('not-a-number')
      .int()
      .min(FIRST_YEAR, 'year-range')
      .max(LAST_YEAR, 'year-range')
      .optional(),
  }),
  heard: z.strictObject({ where: line(120), day: isoDate.nullable(), language: line(80) }),
  checked: z.strictObject({
    work: textCheck.nullable(),
    safety: textCheck.nullable(),
    late: textCheck.nullable(),
  }),
});

/** What of a record counting its signs takes. */
export const awaitedRecord = z.strictObject({
  signs: recordFields.shape.signs,
  when: recordFields.shape.when.pick({ leadDays: true, graceDays: true }),
  work: recordFields.shape.work.pick({ stop: true }),
});
export type AwaitedRecord = z.infer<typeof awaitedRecord>;

/**
 * What an event says beside its name, its days and its giver. Empty members say nothing; a record in which nothing is said
 * is left out of its entry, so that older texts and hashes stay as they are.
 */
export const eventRecord = recordFields.superRefine(({ what, when, signs }, context) => {
  const refuse = (path: (string | number)[], message: string) => {
    context.addIssue({ code: 'custom', path, message });
  };
  if (what.operation === 'other' && what.ownOperation === '') refuse(['what', 'ownOperation'], 'required');
  const { fromDays, toDays } = what.variety;
  if (fromDays !== null && toDays !== null && toDays < fromDays) {
    refuse(['what', 'variety', 'toDays'], 'days-order');
  }
  if (when.repeats === 'every-n-years' && when.everyYears === null) {
    refuse(['when', 'everyYears'], 'years-apart');
  }
  if (when.repeats === 'some-years' && when.rule === '') refuse(['when', 'rule'], 'required');
  if (signs.needed !== null && signs.needed > signs.list.length) refuse(['signs', 'needed'], 'signs-needed');
  if (signs.mustHave !== null && signs.mustHave >= signs.list.length) {
    refuse(['signs', 'mustHave'], 'not-in-list');
  }
});
export type EventRecord = z.infer<typeof eventRecord>;

export const EMPTY_RECORD: EventRecord = {
  what: { operation: null, ownOperation: '', variety: { name: '', fromDays: null, toDays: null }, land: '' },
  when: { leadDays: null, graceDays: null, repeats: 'yearly', everyYears: null, rule: '' },
  signs: { list: [], needed: null, mustHave: null },
  work: {
    ...{ responsible: '', helpers: '', decides: '', owns: '', inputs: '' },
    ...{ ifEarly: '', ifLaterStill: '', stop: null, askWhom: '' },
  },
  trust: { confidence: null, by: '', basis: null },
  heard: { where: '', day: null, language: '' },
  checked: { work: null, safety: null, late: null },
};
