import { describe, expect, it } from 'vitest';
import type { WaitingItem } from '#shared/contracts/today.js';
import { landingOf } from '#src/features/today/model/landing.js';

function waiting(kind: WaitingItem['kind']): WaitingItem {
  return {
    kind,
    calendarId: '0190b1a0-0000-7000-8000-000000000001',
    placeName: 'Upper Tazimel',
    year: 2027,
    number: 2,
    label: null,
    entryId: null,
    entryTitle: null,
    personName: null,
    note: null,
    done: 0,
    of: 12,
  };
}

const answer = waiting('answer-entries');
const sign = waiting('sign-as-elder');
const print = waiting('print-published');

describe('who has just come in', () => {
  it('lands on the review as an elder, to answer or to sign', () => {
    expect(landingOf(['elder'], [print, answer])).toBe(answer);
    expect(landingOf(['elder'], [sign])).toBe(sign);
  });

  it('lands on the sheet as staff', () => {
    expect(landingOf(['staff'], [print])).toBe(print);
  });

  it('lands on the review before the sheet with both roles', () => {
    expect(landingOf(['staff', 'elder'], [print, sign])).toBe(sign);
    expect(landingOf(['staff', 'elder'], [print])).toBe(print);
  });

  it('begins at Today where nothing waits, as an observer, and with the many tasks of an office', () => {
    expect(landingOf(['elder'], [])).toBeNull();
    expect(landingOf(['observer'], [print, answer])).toBeNull();
    expect(landingOf(['officer', 'elder'], [answer])).toBeNull();
    expect(landingOf(['steward', 'staff'], [print])).toBeNull();
  });
});
