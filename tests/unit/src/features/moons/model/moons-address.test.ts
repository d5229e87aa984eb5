import { describe, expect, it } from 'vitest';
import {
  moonQuestionOf,
  readMoonsAddress,
  writeMoonsAddress,
} from '#src/features/moons/model/moons-address.js';

const read = (text: string) => readMoonsAddress(new URLSearchParams(text), 2027);

describe('the address of the Moons', () => {
  it('counts from the Pleiades’ first morning where it names nothing', () => {
    expect(read('')).toEqual({
      year: 2027,
      marker: 'pleiades',
      phenomenon: 'heliacal-rising',
      signMonth: 1,
      begins: 'first-crescent',
    });
  });

  it('brings back what it was given, keeps what is not its own and leaves the usual out', () => {
    const choice = {
      year: 2031,
      marker: null,
      phenomenon: 'heliacal-setting',
      signMonth: 3,
      begins: 'full',
    } as const;
    const written = writeMoonsAddress(new URLSearchParams('placeId=a&year=2000'), choice, 2027);
    expect(readMoonsAddress(written, 2027)).toEqual(choice);
    expect(written.get('placeId')).toBe('a');
    expect(writeMoonsAddress(written, read(''), 2027).toString()).toBe('placeId=a');
  });

  it('takes nothing that the page cannot show', () => {
    expect(read('year=1500&month=13&sign=dance&begins=half')).toEqual(read(''));
    expect(read('year=&month=')).toEqual(read(''));
  });

  it('asks the server without a rule where nothing is counted', () => {
    expect(moonQuestionOf(read('count=none'))).toEqual({ year: 2027 });
    expect(moonQuestionOf(read('month=2'))).toMatchObject({ marker: 'pleiades', month: 2 });
  });
});
