import { describe, expect, it } from 'vitest';
import { EMPTY_RECORD, eventRecord, type EventRecord } from '#shared/contracts/event-record.js';
import { wholeRecord } from '#tests/support/event-record.js';

function refused(record: EventRecord): string[] {
  const parsed = eventRecord.safeParse(record);
  return (parsed.error?.issues ?? []).map(({ path, message }) => `${path.join('.')}: ${message}`);
}

describe('the record of an event', () => {
  it('may say nothing, or everything', () => {
    expect(refused(EMPTY_RECORD)).toEqual([]);
    expect(refused(wholeRecord())).toEqual([]);
  });

  it('cannot need more signs than it names, nor one that is not in the list', () => {
    const signs = { ...wholeRecord().signs, needed: 3, mustHave: 2 };
    expect(refused(wholeRecord({ signs }))).toEqual([
      'signs.needed: signs-needed',
      'signs.mustHave: not-in-list',
    ]);
  });

  it('keeps the length of a crop in order, and says in which years it comes back', () => {
    const { what, when } = wholeRecord();
    const variety = { name: '', fromDays: 90, toDays: 80 };
    expect(refused(wholeRecord({ what: { ...what, variety } }))).toEqual(['what.variety.toDays: days-order']);
    expect(refused(wholeRecord({ when: { ...when, repeats: 'every-n-years' } }))).toEqual([
      'when.everyYears: years-apart',
    ]);
    expect(refused(wholeRecord({ when: { ...when, repeats: 'some-years' } }))).toEqual([
      'when.rule: required',
    ]);
  });

  it('names work that is not in the list', () => {
    const what = { ...wholeRecord().what, operation: 'other' as const };
    expect(refused(wholeRecord({ what }))).toEqual(['what.ownOperation: required']);
  });
});
