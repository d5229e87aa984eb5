import { describe, expect, it } from 'vitest';
import { sameButForVillageWords } from '#shared/calendar/village-words.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD, type EventRecord } from '#shared/contracts/event-record.js';
import { entryInput } from '#tests/support/calendar-api.js';

const doing = (what: Partial<EventRecord['what']>): EntryInput =>
  entryInput({ record: { ...EMPTY_RECORD, what: { ...EMPTY_RECORD.what, ...what } } });
const WEEDING = { operation: 'weed' } as const;
const OTHER = { operation: 'other' } as const;

describe('contents are the same but for the village’s words', () => {
  it.each([
    ['a kind is called otherwise', entryInput(), entryInput({ kindWord: { word: 'Field' } })],
    [
      'a kind of the village’s own is called otherwise',
      entryInput({ kindWord: { id: 'k1', word: 'Field' } }),
      entryInput({ kindWord: { id: 'k1', word: 'Terraces' } }),
    ],
    ['a work is called otherwise', doing(WEEDING), doing({ ...WEEDING, operationWord: { word: 'pull' } })],
    [
      'a work that is nothing built in is called otherwise',
      doing({ ...OTHER, ownOperation: 'turn', operationWord: { id: 'o1', word: 'turn' } }),
      doing({ ...OTHER, ownOperation: 'roll', operationWord: { id: 'o1', word: 'roll' } }),
    ],
  ])('where %s', (_what, was, is) => {
    expect(sameButForVillageWords(was, is)).toBe(true);
  });

  it.each([
    ['the kind is another one', entryInput(), entryInput({ kind: 'safety' })],
    [
      'another word of the village’s own is meant',
      entryInput({ kindWord: { id: 'k1', word: 'Field' } }),
      entryInput({ kindWord: { id: 'k2', word: 'Field' } }),
    ],
    ['the crop is called otherwise', entryInput(), entryInput({ crop: 'millet' })],
    ['the work is another one', doing(WEEDING), doing({ operation: 'sow' })],
    [
      'a work in the entry’s own words is said otherwise',
      doing({ ...OTHER, ownOperation: 'turn' }),
      doing({ ...OTHER, ownOperation: 'roll' }),
    ],
    ['a record is begun', entryInput(), doing(WEEDING)],
  ])('and are not where %s', (_what, was, is) => {
    expect(sameButForVillageWords(was, is)).toBe(false);
  });
});
