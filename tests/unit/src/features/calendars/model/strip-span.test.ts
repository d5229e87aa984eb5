import { describe, expect, it } from 'vitest';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import {
  centreOf,
  nextCentre,
  wholeSpan,
  zoomedBy,
  zoomedSpan,
} from '#src/features/calendars/model/strip-span.js';

const year = wholeSpan(2027, null);

describe('the days that a strip shows', () => {
  it('are the civil year, or a whole year from the local beginning', () => {
    expect(year).toEqual({ first: dayNumberOf(2027, 1, 1), last: dayNumberOf(2027, 12, 31) });
    const local = wholeSpan(2027, { month: 6, day: 23 });
    expect(local).toEqual({ first: dayNumberOf(2027, 6, 23), last: dayNumberOf(2028, 6, 22) });
    expect(local.last - local.first + 1).toBe(366);
  });

  it('lie around the wanted day, and never reach over the ends of the year', () => {
    const june = dayNumberOf(2027, 6, 15);
    const month = zoomedSpan('month', year, june);
    expect(month.last - month.first + 1).toBe(31);
    expect(Math.abs(centreOf(month) - june)).toBeLessThanOrEqual(1);
    expect(zoomedSpan('month', year, year.first).first).toBe(year.first);
    expect(zoomedSpan('season', year, year.last).last).toBe(year.last);
    expect(zoomedSpan('year', year, june)).toEqual(year);
  });

  it('go on by two thirds until the year ends, so that nothing is jumped over', () => {
    let centre = centreOf(zoomedSpan('season', year, year.first));
    const spans = [zoomedSpan('season', year, centre)];
    for (let step = 0; step < 8; step += 1) {
      centre = nextCentre('season', year, centre, 1);
      spans.push(zoomedSpan('season', year, centre));
    }
    expect(spans.at(-1)?.last).toBe(year.last);
    spans.slice(1).forEach((span, index) => {
      expect(span.first).toBeLessThanOrEqual((spans[index]?.last ?? 0) + 1);
    });
    expect(zoomedSpan('season', year, nextCentre('season', year, year.first, -1)).first).toBe(year.first);
  });

  it('come closer and wider, as far as there is something closer and wider', () => {
    expect([zoomedBy('year', 1), zoomedBy('season', 1), zoomedBy('month', 1)]).toEqual([
      'season',
      'month',
      'month',
    ]);
    expect([zoomedBy('month', -1), zoomedBy('year', -1)]).toEqual(['season', 'year']);
  });
});
