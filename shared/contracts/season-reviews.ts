import { z } from 'zod';
import { actualDays } from './actual-days.js';
import { entryDates, entryKind } from './calendars.js';
import { id, instant, isoDate, listOf, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { seenDay } from './entry-lead.js';
import { phenomenon } from './stars.js';
import { notice } from './weather.js';

const LESSON_MAX = 500;
/** For each entry, and for the year as a whole. */
export const LESSONS_MAX = 20;
export const DECISIONS_MAX = 10;

/** What is to be done otherwise next year; `own-words` is said in words alone. */
export const DECISION_KINDS = ['earlier', 'later', 'other-sign', 'own-words'] as const;
const decisionKind = z.enum(DECISION_KINDS);
export type DecisionKind = (typeof DECISION_KINDS)[number];

/** Null where it is about the whole year. */
const about = id.nullable();

export const lessonInput = z.strictObject({
  entryId: about,
  text: text(LESSON_MAX).refine((said) => said !== '', 'required'),
});
export type LessonInput = z.infer<typeof lessonInput>;

export const decisionInput = z
  .strictObject({ entryId: about, kind: decisionKind, text: text(LESSON_MAX) })
  .superRefine(({ entryId, kind, text: said }, context) => {
    if (said === '' && (kind === 'own-words' || entryId === null)) {
      context.addIssue({ code: 'custom', path: ['text'], message: 'required' });
    }
  });
export type DecisionInput = z.infer<typeof decisionInput>;

export const lesson = z.strictObject({
  id,
  text: z.string(),
  by: z.string(),
  /** Whose hand wrote it down, where it was not its author's. */
  typedBy: z.string().optional(),
  writtenAt: instant,
  mine: z.boolean(),
});
export type Lesson = z.infer<typeof lesson>;

export const ticked = z.strictObject({ on: isoDate, by: z.string() });

export const decision = z.strictObject({
  id,
  kind: decisionKind,
  text: z.string(),
  by: z.string(),
  decidedAt: instant,
  /** Since it was ticked off in next year's draft. */
  done: ticked.nullable(),
});
export type Decision = z.infer<typeof decision>;

/** A sign for which an entry waited, and the first day on which it was marked as seen for it. */
export const reviewedSign = z.strictObject({
  name: z.string(),
  mustHave: z.boolean(),
  /** False for a sign that has no id, which nobody can mark. */
  canBeMarked: z.boolean(),
  cameOn: isoDate.nullable(),
});

export const reviewedEntry = z.strictObject({
  entryId: id,
  titleVillage: z.string(),
  titleOfficer: z.string(),
  kind: entryKind,
  protectiveWatch: z.boolean(),
  /** As the village went by it: of the newest published version, else of the draft. */
  planned: entryDates,
  isPublished: z.boolean(),
  /** False once it was taken out of the draft: its days can be typed no more. */
  inDraft: z.boolean(),
  actual: actualDays.nullable(),
  /** Null where no star leads it. `seen` is null while nobody wrote down that it was. */
  star: z.strictObject({ name: z.string(), phenomenon, seen: seenDay.nullable() }).nullable(),
  signs: z.array(reviewedSign),
  /** Signs in words, of which no days are kept. */
  otherSigns: z.string(),
  lessons: z.array(lesson),
  decisions: z.array(decision),
});
export type ReviewedEntry = z.infer<typeof reviewedEntry>;

export const seasonReview = z.strictObject({
  calendarId: id,
  placeName: z.string(),
  year: z.number().int(),
  villageLanguageTag: z.string(),
  /** The version by which the village went; null where none is published. */
  label: z.string().nullable(),
  /** Those that this person sees, in their order. */
  entries: z.array(reviewedEntry),
  /** About the whole year. */
  lessons: z.array(lesson),
  decisions: z.array(decision),
  /** Notices of the weather service of that year, oldest first: told beside, and judged by nobody. */
  notices: z.array(notice),
  /** Next year's calendar of the same place, where decisions stand as tasks. */
  nextCalendarId: id.nullable(),
});
export type SeasonReview = z.infer<typeof seasonReview>;

/** A decision of the year before, as something to do in this draft. */
export const seasonTask = decision.extend({
  /** The entry of this draft that it is about; null where it is about the year, or its entry did not come along. */
  entryId: about,
  /** Of the entry in the year before; null where it is about the year. */
  title: z.string().nullable(),
  fromYear: z.number().int(),
  fromCalendarId: id,
});
export type SeasonTask = z.infer<typeof seasonTask>;

const params = z.strictObject({ calendarId: id });
const lessonParams = z.strictObject({ calendarId: id, lessonId: id });
const decisionParams = z.strictObject({ calendarId: id, decisionId: id });
const taskParams = z.strictObject({ calendarId: id, taskId: id });
const path = '/api/calendars/:calendarId/season-review';
const tasksPath = '/api/calendars/:calendarId/season-tasks';

export const seasonReviewsEndpoints = {
  read: defineEndpoint({
    id: 'readSeasonReview',
    method: 'GET',
    path,
    summary: 'The year looked back at: what was planned, what happened, what came, lessons and decisions',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params,
    response: seasonReview,
  }),
  addLesson: defineEndpoint({
    id: 'addSeasonLesson',
    method: 'POST',
    path: `${path}/lessons`,
    summary: 'Write down what the year taught, about an entry or the whole year',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params,
    body: lessonInput,
    response: lesson,
    status: 201,
  }),
  removeLesson: defineEndpoint({
    id: 'removeSeasonLesson',
    method: 'DELETE',
    path: `${path}/lessons/:lessonId`,
    summary: 'Take out a lesson, by whoever wrote it',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: lessonParams,
  }),
  decide: defineEndpoint({
    id: 'addSeasonDecision',
    method: 'POST',
    path: `${path}/decisions`,
    summary: 'Write down what is to be done otherwise: a task of next year’s draft',
    access: member('calendar', 'officer', 'steward'),
    params,
    body: decisionInput,
    response: decision,
    status: 201,
  }),
  removeDecision: defineEndpoint({
    id: 'removeSeasonDecision',
    method: 'DELETE',
    path: `${path}/decisions/:decisionId`,
    summary: 'Take out a decision, and the task with it',
    access: member('calendar', 'officer', 'steward'),
    params: decisionParams,
  }),
  listTasks: defineEndpoint({
    id: 'listSeasonTasks',
    method: 'GET',
    path: tasksPath,
    summary: 'What the review of the year before decided for this draft',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params,
    response: listOf(seasonTask),
  }),
  tick: defineEndpoint({
    id: 'tickSeasonTask',
    method: 'PUT',
    path: `${tasksPath}/:taskId/done`,
    summary:
      'Tick off a task, with the day and the name of whoever did it; one that is ticked stays as it is',
    access: member('calendar', 'officer'),
    params: taskParams,
    response: seasonTask,
  }),
  untick: defineEndpoint({
    id: 'untickSeasonTask',
    method: 'DELETE',
    path: `${tasksPath}/:taskId/done`,
    summary: 'Take the tick off a task again',
    access: member('calendar', 'officer'),
    params: taskParams,
    response: seasonTask,
  }),
} as const;
