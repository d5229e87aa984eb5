import { describe, expect, expectTypeOf, it } from 'vitest';
import { SIGN_OFF_NEEDS, signOffNeeds, type NeedsOfEntry } from '#shared/calendar/sign-off-needs.js';
import { entryInput, type EntryInput } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { content } from '#tests/support/draft-of-tazimel.js';
import { wholeRecord } from '#tests/support/event-record.js';

const sowing = (changes: Partial<EntryInput> = {}) =>
  content({
    ...{ kind: 'farm', titleVillage: 'Aru', crop: 'millet', giver: 'Elder A-1', ifLate: 'Sow short millet.' },
    record: wholeRecord(),
    ...changes,
  });

describe('what an event must say before elders are asked', () => {
  it('is all that its kind needs where it has no record, and nothing for an entry of the time before', () => {
    const bare = content({ record: undefined, titleVillage: '', giver: '', crop: '' });
    expect(signOffNeeds(bare)).toEqual(signOffNeeds({ ...bare, record: EMPTY_RECORD }));
    expect(signOffNeeds(bare)).toContain('ifLate');
    expect(signOffNeeds(bare, true)).toEqual([]);
  });

  it('is all of it for an older entry, too, once something of its record is said', () => {
    const record = { ...EMPTY_RECORD, trust: { ...EMPTY_RECORD.trust, confidence: 'fair' as const } };
    expect(signOffNeeds(content({ record }), true)).toContain('responsible');
  });

  it('is what its days count from for every entry, also one of the time before', () => {
    const lead = { type: 'none', way: 'marker' } as const;
    expect(signOffNeeds(content({ record: undefined, lead }), true)).toEqual(['lead']);
    expect(signOffNeeds(sowing({ lead }))).toEqual(['lead']);
  });

  it('is nothing more where all is said, and such an entry is accepted', () => {
    expect(signOffNeeds(sowing())).toEqual([]);
    expect(entryInput.safeParse(sowing()).success).toBe(true);
  });

  it('is all of it, in the order of the form, for farm work of which nothing is said', () => {
    const record = { ...EMPTY_RECORD, what: { ...EMPTY_RECORD.what, operation: 'sow' as const } };
    const lead = { type: 'none', way: 'sky' } as const;
    const bare = sowing({ record, titleVillage: '', crop: '', giver: '', ifLate: '', caution: 'Hot.', lead });
    const all = SIGN_OFF_NEEDS.filter((need) => !['operation', 'caution', 'checkedLate'].includes(need));
    expect(signOffNeeds(bare)).toEqual(all);
  });

  it('asks for signs where seed goes into the ground, and not for weeding', () => {
    const signs = { list: [], needed: null, mustHave: null };
    expect(signOffNeeds(sowing({ record: wholeRecord({ signs }) }))).toEqual(['signsNeeded', 'mustHaveSign']);
    const what = { ...wholeRecord().what, operation: 'weed' as const };
    expect(signOffNeeds(sowing({ record: wholeRecord({ signs, what }) }))).toEqual([]);
  });

  it('asks a mark of the sky for trust and giver alone', () => {
    const needs = signOffNeeds(
      content({ kind: 'marker-only', titleVillage: 'Aru', giver: '', ifLate: '', record: EMPTY_RECORD }),
    );
    expect(needs).toEqual([
      ...['confidence', 'confidenceBy', 'basis', 'giver', 'heardWhere', 'heardDay', 'heardLanguage'],
    ]);
  });

  it('asks safety for its caution, and a caution for the office that read it', () => {
    expect(signOffNeeds(sowing({ kind: 'safety', caution: '' }))).toEqual(['caution']);
    const checked = { ...wholeRecord().checked, safety: null };
    expect(signOffNeeds(sowing({ caution: 'Thin ice.', record: wholeRecord({ checked }) }))).toEqual([
      'checkedSafety',
    ]);
  });

  it('asks nobody for a name who does not want to be named', () => {
    const trust = { ...wholeRecord().trust, by: '' };
    const unnamed = { giver: '', record: wholeRecord({ trust }) };
    expect(signOffNeeds(sowing(unnamed))).toEqual(['confidenceBy', 'giver']);
    expect(signOffNeeds(sowing({ ...unnamed, sharing: { ...PLAIN_DETAILS, naming: 'role' } }))).toEqual([]);
  });

  it('looks at entries as the contract has them', () => {
    expectTypeOf<EntryInput>().toExtend<NeedsOfEntry>();
  });
});
