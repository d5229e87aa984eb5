import { describe, expect, it } from 'vitest';
import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import type { EntryComparison } from '#shared/contracts/versions.js';
import { aboutTopic, topicsOf } from '#src/features/versions/model/change-topics.js';

const entry = (changes: Partial<EntryComparison>): EntryComparison => ({
  ...{
    entryId: '0190a3a0-0000-7000-8000-000000000001',
    change: 'changed',
    titleOfficer: 'Sow',
    titleVillage: '',
  },
  ...{ before: null, after: null, fields: [], ...changes },
});
const field = (name: string, before: unknown = 'a', after: unknown = 'b') => ({ field: name, before, after });

describe('what a difference is about', () => {
  it('is days, words, levels or people, by the fields that differ', () => {
    expect([...topicsOf(entry({ fields: [field('dates.window'), field('notes')] }))]).toEqual([
      'dates',
      'text',
    ]);
    expect([...topicsOf(entry({ fields: [field('sharing'), field('agreedToPrint')] }))]).toEqual(['levels']);
    expect([...topicsOf(entry({ fields: [field('giver')] }))]).toEqual(['people']);
  });

  it('finds people in the record of an entry, apart from its words', () => {
    const owns = { ...EMPTY_RECORD, work: { ...EMPTY_RECORD.work, owns: 'Marrun’s house' } };
    const land = { ...EMPTY_RECORD, what: { ...EMPTY_RECORD.what, land: 'the lower terrace' } };
    expect([...topicsOf(entry({ fields: [field('record', EMPTY_RECORD, owns)] }))]).toEqual(['people']);
    expect([...topicsOf(entry({ fields: [field('record', EMPTY_RECORD, land)] }))]).toEqual(['text']);
  });

  it('is everything for what is new or gone, and nothing for what stays', () => {
    const all = [entry({ change: 'added' }), entry({ change: 'same' }), entry({ fields: [field('notes')] })];
    expect(aboutTopic(all, 'levels')).toEqual([all[0]]);
    expect(aboutTopic(all, null)).toBe(all);
  });
});
