import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutWatchCard } from '#shared/sheet/watch-card.js';
import type { WatchCardModel, WatchPicture } from '#shared/sheet/watch-card-model.js';
import { allWords, faultsOf, texts } from '#tests/support/sheet/page-checks.js';

const SKYLINE = [
  { azimuthDeg: 0, altitudeDeg: 2 },
  { azimuthDeg: 90, altitudeDeg: 3 },
  { azimuthDeg: 180, altitudeDeg: 1 },
];

function picture(more: Partial<WatchPicture> = {}): WatchPicture {
  const path = [3, 5, 8, 11, 13].map((altitudeDeg, index) => ({
    azimuthDeg: 66 + index,
    altitudeDeg,
    isSeen: index < 3,
    isUp: true,
  }));
  return {
    skyline: SKYLINE,
    path,
    star: { azimuthDeg: 67, altitudeDeg: 5 },
    stop: { azimuthDeg: 70, altitudeDeg: 13 },
    labels: [
      { azimuthDeg: 66, altitudeDeg: 3, words: '04:51 comes up' },
      { azimuthDeg: 68, altitudeDeg: 8, words: '05:21 too light' },
      { azimuthDeg: 70, altitudeDeg: 13, words: '05:48 stop' },
    ],
    compass: ['north', 'north-east', 'east', 'south-east'].map((words, index) => ({
      azimuthDeg: index * 45,
      words,
    })),
    handWords: '1 hand',
    ...more,
  };
}

function model(more: Partial<WatchCardModel> = {}): WatchCardModel {
  return {
    title: 'Look for Pleiades',
    when: 'Upper terraces, morning of Thursday 10 June 2027',
    limit: 'Stop at 05:48',
    picture: picture(),
    sentences: ['Look for Pleiades at about 05:06 in the east-north-east, half a hand above the skyline.'],
    cautions: ['Eyes only: no phone camera, no binoculars, and never the Sun.'],
    foot: 'For clear air: haze, cloud, hills and eyes can move a sighting by days.',
    ...more,
  };
}
const layout = (more: Partial<WatchCardModel> = {}) => layoutWatchCard(model(more), fontMeasurer);
const skylineSpan = (card: ReturnType<typeof layout>) => {
  const ys = card.primitives.flatMap((one) => (one.type === 'line' && one.role === 'ground' ? [one.y1] : []));
  return Math.max(...ys);
};

describe('a watch card', () => {
  it('is one upright page of A5 on which no word meets another and nothing leaves the margin', () => {
    const card = layout();
    expect([card.width, card.height]).toEqual([148, 210]);
    expect(faultsOf(card)).toEqual([]);
  });

  it('has the time to stop in the largest letters, at least 7.5 mm high however long it is', () => {
    for (const limit of ['Stop at 05:48', 'Not before 18:25', 'The Sun stays down all this day']) {
      const sizes = texts([layout({ limit })]).map(({ sizePt }) => sizePt);
      const ofLimit = texts([layout({ limit })]).find(({ lines }) => limit.startsWith(lines[0]?.text ?? '—'));
      expect(ofLimit?.sizePt).toBe(Math.max(...sizes));
      expect(ofLimit?.sizePt).toBeGreaterThanOrEqual(30);
    }
  });

  it('never sets sentences and cautions below 14 points, nor anything below 12', () => {
    for (const { role, sizePt } of texts([layout()])) {
      expect(sizePt).toBeGreaterThanOrEqual(role === 'foot' ? 12 : 14);
    }
  });

  it('makes the picture smaller for many sentences, and leaves out whole ones from the end', () => {
    const long = Array.from(
      { length: 14 },
      (_, index) => `Sentence ${String(index)} takes about one whole line.`,
    );
    const few = layout();
    const many = layout({ sentences: long });
    expect(skylineSpan(many)).toBeLessThan(skylineSpan(few));
    expect(faultsOf(many)).toEqual([]);
    const words = allWords([many]);
    expect(words).toContain('Sentence 0 takes about one whole line.');
    expect(words).not.toContain('Sentence 13');
    expect(words).toContain('Eyes only');
  });

  it('does without a picture where there is nothing to look at', () => {
    const card = layout({ picture: null, limit: 'No watch on this day' });
    expect(card.primitives.some((one) => one.type === 'icon')).toBe(false);
    expect(faultsOf(card)).toEqual([]);
  });
});

describe('its picture', () => {
  it('draws the path as a thick line while the star is seen, and dotted after', () => {
    const { primitives } = layout();
    const thick = primitives.filter((one) => one.type === 'line' && one.role === 'star-path');
    const small = primitives.filter(
      (one) => one.type === 'disc' && one.role === 'star-path' && one.radius < 0.5,
    );
    expect(thick).toHaveLength(2);
    expect(small.length).toBeGreaterThan(3);
    const stop = primitives.find((one) => one.type === 'line' && one.role === 'stop' && one.strokeMm > 1);
    expect(stop).toBeDefined();
  });

  it('is true: one hand across is as long as one hand up', () => {
    const star = { azimuthDeg: 90, altitudeDeg: 13 };
    const card = layout({
      picture: picture({
        skyline: [],
        star,
        stop: null,
        labels: [],
        path: [
          { azimuthDeg: 90, altitudeDeg: 3, isSeen: true, isUp: true },
          { azimuthDeg: 90, altitudeDeg: 13, isSeen: true, isUp: true },
          { azimuthDeg: 100, altitudeDeg: 13, isSeen: true, isUp: true },
        ],
      }),
    });
    const [up, across] = card.primitives.flatMap((one) =>
      one.type === 'line' && one.role === 'star-path' ? [Math.hypot(one.x2 - one.x1, one.y2 - one.y1)] : [],
    );
    expect(up).toBeCloseTo(across ?? 0, 2);
    const rod = card.primitives.flatMap((one) =>
      one.type === 'rect' && one.role === 'rod' ? [one.height] : [],
    );
    expect((rod[0] ?? 0) + (rod[1] ?? 0)).toBeCloseTo(up ?? 0, 2);
  });

  it('keeps crowded times apart, also for a star high up, near the edge of the picture', () => {
    const crowded = [70, 70.1, 70.2, 70.3].map((altitudeDeg, index) => ({
      azimuthDeg: 350 + index * 8,
      altitudeDeg,
      words: `0${String(5 + index)}:00 says this`,
    }));
    for (const altitudeDeg of [4, 40, 75]) {
      const card = layout({
        picture: picture({
          star: { azimuthDeg: 358, altitudeDeg },
          labels: crowded.map((label) => ({ ...label, altitudeDeg })),
        }),
      });
      expect(faultsOf(card)).toEqual([]);
    }
  });

  it('runs through north', () => {
    const northern = picture({
      star: { azimuthDeg: 1, altitudeDeg: 8 },
      stop: null,
      labels: [],
      path: [359, 0, 1].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 8, isSeen: true, isUp: true })),
    });
    const lines = layout({ picture: northern }).primitives.flatMap((one) =>
      one.type === 'line' && one.role === 'star-path' ? [one.x2 - one.x1] : [],
    );
    expect(lines).toHaveLength(2);
    for (const length of lines) expect(length).toBeGreaterThan(0);
    expect(lines[0]).toBeCloseTo(lines[1] ?? 0, 2);
  });
});
