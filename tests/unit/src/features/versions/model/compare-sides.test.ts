import { describe, expect, it } from 'vitest';
import type { VersionState, VersionSummary } from '#shared/contracts/versions.js';
import { sideChoices, sidesOf } from '#src/features/versions/model/compare-sides.js';

const version = (number: number, state: VersionState) => ({ number, state }) as unknown as VersionSummary;
const three = [version(3, 'in-review'), version(2, 'changes-asked'), version(1, 'published')];
const nothing = { from: null, to: null };

describe('which two stand beside each other', () => {
  it('is the newest against what the village goes by', () => {
    expect(sidesOf(nothing, three, true)).toEqual({ from: '1', to: 'draft' });
    expect(sidesOf(nothing, three, false)).toEqual({ from: '1', to: '3' });
  });

  it('is the newest against the one before it where nothing is published', () => {
    expect(sidesOf(nothing, [version(2, 'in-review'), version(1, 'changes-asked')], false)).toEqual({
      from: '1',
      to: '2',
    });
  });

  it('is what the address names, as far as the person may see it', () => {
    expect(sidesOf({ from: '2', to: '3' }, three, false)).toEqual({ from: '2', to: '3' });
    expect(sidesOf({ from: '3', to: '1' }, three, false)).toEqual({ from: '3', to: '1' });
    expect(sidesOf({ from: 'draft', to: '9' }, three, false)).toEqual({ from: '1', to: '3' });
  });

  it('is nothing while there are not two', () => {
    expect(sidesOf(nothing, [], true)).toBeNull();
    expect(sidesOf(nothing, [version(1, 'published')], false)).toBeNull();
    expect(sidesOf(nothing, [version(1, 'in-review')], true)).toEqual({ from: '1', to: 'draft' });
  });

  it('never offers the draft to those who do not see it', () => {
    expect(sideChoices(three, false)).toEqual(['3', '2', '1']);
    expect(sideChoices(three, true)[0]).toBe('draft');
  });
});
