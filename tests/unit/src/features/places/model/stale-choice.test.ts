import { describe, expect, it } from 'vitest';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { clashesOf, firstChoices, joinStates } from '#src/features/places/model/stale-choice.js';

const base = UPPER_TAZIMEL.place;
const theirs = { ...base, name: 'Theirs', elevationM: 10 };
const mine = { ...base, name: 'Mine', latitudeDeg: 13 };

describe('two people wrote to one place', () => {
  it('says for every field who changed it', () => {
    expect(clashesOf(base, theirs, mine)).toEqual([
      { field: 'name', changedBy: 'both' },
      { field: 'latitudeDeg', changedBy: 'mine' },
      { field: 'elevationM', changedBy: 'theirs' },
    ]);
  });

  it('asks only where both changed it', () => {
    expect(firstChoices(clashesOf(base, theirs, mine))).toEqual({
      latitudeDeg: 'mine',
      elevationM: 'theirs',
    });
  });

  it('goes on only when every field has a choice', () => {
    const clashes = clashesOf(base, theirs, mine);
    const choices = firstChoices(clashes);
    expect(joinStates(clashes, choices, theirs, mine)).toBeNull();
    expect(joinStates(clashes, { ...choices, name: 'mine' }, theirs, mine)).toEqual({
      ...base,
      name: 'Mine',
      latitudeDeg: 13,
      elevationM: 10,
    });
  });

  it('asks for every difference where nobody knows what the draft began from', () => {
    const clashes = clashesOf(null, theirs, mine);
    expect(clashes.map(({ changedBy }) => changedBy)).toEqual(['both', 'both', 'both']);
    expect(firstChoices(clashes)).toEqual({});
  });

  it('has nothing to ask where both wrote the same', () => {
    expect(clashesOf(base, { ...base, name: 'Same' }, { ...base, name: 'Same' })).toEqual([]);
  });
});
