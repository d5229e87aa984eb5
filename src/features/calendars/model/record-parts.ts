import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

/**
 * What of a record is chosen together when two people wrote it, as paths into it: a work and its own name, signs and how
 * many of them are needed, how often and in which years. Everything else stands by itself.
 */
export const RECORD_PARTS = {
  operation: ['what.operation', 'what.ownOperation', 'what.operationWord'],
  variety: ['what.variety'],
  land: ['what.land'],
  leadDays: ['when.leadDays'],
  graceDays: ['when.graceDays'],
  repeats: ['when.repeats', 'when.everyYears', 'when.rule'],
  signs: ['signs'],
  responsible: ['work.responsible'],
  helpers: ['work.helpers'],
  decides: ['work.decides'],
  owns: ['work.owns'],
  inputs: ['work.inputs'],
  ifEarly: ['work.ifEarly'],
  ifLaterStill: ['work.ifLaterStill'],
  stop: ['work.stop'],
  askWhom: ['work.askWhom'],
  confidence: ['trust.confidence', 'trust.by'],
  basis: ['trust.basis'],
  sinceYear: ['trust.sinceYear'],
  checkedWork: ['checked.work'],
  checkedSafety: ['checked.safety'],
  checkedLate: ['checked.late'],
  heard: ['heard'],
} as const satisfies Record<string, readonly string[]>;

export type RecordPart = keyof typeof RECORD_PARTS;
export const RECORD_PART_NAMES = Object.keys(RECORD_PARTS) as RecordPart[];

/** Whether two records say the same in a part; one that is missing says nothing. */
export function sameRecordPart(
  part: RecordPart,
  a: EventRecord | undefined,
  b: EventRecord | undefined,
): boolean {
  return RECORD_PARTS[part].every((path) => sameJson(valueAt(a, path) ?? null, valueAt(b, path) ?? null));
}

/** A record with one part as another one says it; undefined where nothing is said in it any more. */
export function withRecordPart(
  part: RecordPart,
  into: EventRecord | undefined,
  from: EventRecord | undefined,
): EventRecord | undefined {
  const copy = structuredClone(into ?? EMPTY_RECORD);
  for (const path of RECORD_PARTS[part]) {
    const [group = '', field] = path.split('.');
    const target = copy as unknown as Record<string, Record<string, unknown>>;
    const value = valueAt(from, path);
    if (field === undefined) target[group] = value as Record<string, unknown>;
    else if (value === undefined) Reflect.deleteProperty(target[group] ?? {}, field);
    else target[group] = { ...target[group], [field]: value };
  }
  return sameJson(copy, EMPTY_RECORD) ? undefined : copy;
}

function valueAt(record: EventRecord | undefined, path: string): unknown {
  let value: unknown = record ?? EMPTY_RECORD;
  for (const step of path.split('.')) value = (value as Record<string, unknown> | undefined)?.[step];
  return value;
}
