import type { EntryComparison, FieldChange } from '#shared/contracts/versions.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

/** What a difference is about. */
export const CHANGE_TOPICS = ['dates', 'text', 'levels', 'people'] as const;
export type ChangeTopic = (typeof CHANGE_TOPICS)[number];

const TOPIC_OF: Readonly<Record<string, ChangeTopic>> = {
  lead: 'dates',
  marker: 'dates',
  window: 'dates',
  offsets: 'dates',
  hasLastDate: 'dates',
  lastDate: 'dates',
  protectiveWatch: 'dates',
  sharingLevel: 'levels',
  sharing: 'levels',
  agreedToPrint: 'levels',
  giver: 'people',
  giverId: 'people',
};

export function topicOf(field: string): ChangeTopic {
  return field.startsWith('dates.') ? 'dates' : (TOPIC_OF[field] ?? 'text');
}

/** A new entry and one that is gone are about everything. */
export function topicsOf({ change, fields }: EntryComparison): ReadonlySet<ChangeTopic> {
  if (change === 'added' || change === 'removed') return new Set(CHANGE_TOPICS);
  return new Set(fields.flatMap(fieldTopics));
}

function fieldTopics(change: FieldChange): ChangeTopic[] {
  return change.field === 'record' ? recordTopics(change) : [topicOf(change.field)];
}

/** Whose work it is, who knows it and who told it stand in the record, beside its words. */
const RECORD_PEOPLE: Readonly<Record<string, readonly string[]>> = {
  work: ['responsible', 'helpers', 'decides', 'owns', 'askWhom'],
  trust: ['by'],
  heard: ['where', 'language'],
};

function recordTopics({ before, after }: FieldChange): ChangeTopic[] {
  const was = recordParts(before);
  const is = recordParts(after);
  const topics: ChangeTopic[] = [];
  if (!sameJson(was.people, is.people)) topics.push('people');
  if (!sameJson(was.words, is.words)) topics.push('text');
  return topics;
}

function recordParts(record: unknown): { people: Record<string, unknown>; words: Record<string, unknown> } {
  const people: Record<string, unknown> = {};
  const words: Record<string, unknown> = {};
  for (const [group, members] of membersOf(record)) {
    for (const [name, value] of membersOf(members)) {
      const into = RECORD_PEOPLE[group]?.includes(name) === true ? people : words;
      into[`${group}.${name}`] = value;
    }
  }
  return { people, words };
}

function membersOf(value: unknown): [string, unknown][] {
  return typeof value === 'object' && value !== null ? Object.entries(value) : [];
}

/** Only what is about the topic; without one, everything. */
export function aboutTopic(
  entries: readonly EntryComparison[],
  topic: ChangeTopic | null,
): readonly EntryComparison[] {
  return topic === null ? entries : entries.filter((entry) => topicsOf(entry).has(topic));
}
