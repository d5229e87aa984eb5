import { describe, expect, expectTypeOf, it } from 'vitest';
import { ENTRY_WARNINGS, type EntryDates, type EntryTiming } from '#shared/calendar/entry-model.js';
import { VERSION_STATES } from '#shared/calendar/version-state.js';
import { ENTRY_GAPS, PEOPLE_GAPS, type AnswerFact, type SignatureFact } from '#shared/calendar/sign-off.js';
import * as calendars from '#shared/contracts/calendars.js';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import type * as sky from '#shared/sky/index.js';
import type { Answer } from '#shared/contracts/reviews.js';
import * as moves from '#shared/contracts/moves.js';
import * as versions from '#shared/contracts/versions.js';
import { MOVE_CAUSES } from '#shared/calendar/day-grounds.js';
import type { WhyMoved } from '#shared/calendar/why-moved.js';

/** The rules may not import the contracts, so here both are held against each other. */
describe('rules and contracts', () => {
  it('know the same words', () => {
    expect(ENTRY_WARNINGS).toEqual(calendars.ENTRY_WARNINGS);
    expect(VERSION_STATES).toEqual(versions.VERSION_STATES);
    expect(MOVE_CAUSES).toEqual(moves.MOVE_CAUSES);
    expect([...PEOPLE_GAPS, ...ENTRY_GAPS]).toEqual(versions.SIGN_OFF_GAPS);
  });

  it('describe an entry and its dates alike', () => {
    expectTypeOf<calendars.EntryInput>().toExtend<EntryTiming>();
    expectTypeOf<EntryDates>().toEqualTypeOf<calendars.EntryDates>();
    expectTypeOf<SkyMarkerSpec>().toEqualTypeOf<sky.SkyMarkerSpec>();
    expectTypeOf<WhyMoved>().toEqualTypeOf<moves.WhyMoved>();
    expectTypeOf<Answer>().toExtend<AnswerFact>();
    expectTypeOf<versions.Signature>().toExtend<SignatureFact>();
  });
});
