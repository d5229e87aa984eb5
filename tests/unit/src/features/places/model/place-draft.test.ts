import { describe, expect, it } from 'vitest';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import {
  differingFields,
  draftOf,
  emptyDraft,
  isChanged,
  isKeptPlace,
  joinedDraft,
  readableOf,
  readDraft,
  skylineOf,
} from '#src/features/places/model/place-draft.js';
import { previewOf } from '#src/features/places/model/place-preview.js';

const saved = UPPER_TAZIMEL.place;

describe('a draft of a saved place', () => {
  it('says the same as the place until something is changed', () => {
    const draft = draftOf(saved);
    expect(isChanged(draft, saved)).toBe(false);
    const reading = readDraft(draft);
    expect(reading.ok && differingFields(reading.input, saved)).toEqual([]);
  });

  it('is changed by what cannot be read yet as well', () => {
    expect(isChanged({ ...draftOf(saved), latitude: '12° 75′' }, saved)).toBe(true);
  });

  it('keeps what was typed, also where it is wrong, through a reload', () => {
    const draft = { ...draftOf(saved), latitude: '12° 75′ N', skylineText: '90, thirty' };
    const kept: unknown = JSON.parse(JSON.stringify({ draft, base: saved }));
    expect(isKeptPlace(kept) && kept.draft).toEqual(draft);
  });

  it('of an older release is left alone', () => {
    expect(isKeptPlace({ draft: { name: 'x' }, base: null })).toBe(false);
  });
});

describe('reading a draft', () => {
  it('gives one problem for each field and nothing to send', () => {
    const reading = readDraft({
      ...draftOf(saved),
      name: ' ',
      latitude: '12° 75′ N',
      elevation: '20000',
      skylineText: '90, thirty\n100, 2',
    });
    expect(reading.ok).toBe(false);
    expect(reading.problems).toEqual({
      name: { kind: 'code', code: 'required' },
      latitudeDeg: { kind: 'coordinate', problem: { code: 'minutes', value: '75' } },
      elevationM: { kind: 'code', code: 'elevation-range' },
      skyline: {
        kind: 'skyline-lines',
        problems: [{ line: 1, code: 'no-height', piece: 'thirty', other: null }],
      },
    });
  });

  it('says nothing about the clock while the coordinates are missing', () => {
    const missing = readDraft(emptyDraft());
    expect(Object.keys(missing.problems).sort()).toEqual([
      'elevationM',
      'latitudeDeg',
      'longitudeDeg',
      'name',
    ]);
    const found = readDraft({ ...draftOf(saved), timeZone: '' });
    expect(found.ok).toBe(false);
    expect(found.problems).toEqual({ timeZone: { kind: 'no-clock' } });
  });

  it('takes an open table once all of it is right, and until then the skyline as it was', () => {
    const draft = { ...draftOf(saved), skylineText: '90, 4' };
    expect(skylineOf(draft)).toEqual([{ azimuthDeg: 90, altitudeDeg: 4 }]);
    const reading = readDraft(draft);
    expect(reading.ok && reading.input.skyline).toEqual([{ azimuthDeg: 90, altitudeDeg: 4 }]);
    expect(skylineOf({ ...draft, skylineText: '90, four' })).toEqual(draft.skyline);
  });
});

describe('a new place', () => {
  it('can be computed as soon as its coordinates are there', () => {
    expect(previewOf(emptyDraft())).toBeNull();
    const preview = previewOf({ ...emptyDraft(), latitude: '12 N', longitude: '39 E' });
    expect(preview).toMatchObject({ latitudeDeg: 12, longitudeDeg: 39, skyline: [] });
  });
});

describe('two states of a place', () => {
  it('do not differ by 0° and 360° saying the same', () => {
    const turn = { ...saved, skyline: [...saved.skyline].filter((point) => point.azimuthDeg !== 360) };
    expect(saved.skyline.some((point) => point.azimuthDeg === 360)).toBe(true);
    expect(differingFields(saved, turn)).toEqual([]);
  });

  it('are compared without what cannot be read, and joined without losing it', () => {
    const draft = { ...draftOf(saved), name: 'Mine', latitude: '12° 75′ N' };
    expect(differingFields(readableOf(draft, saved), saved)).toEqual(['name']);
    const joined = joinedDraft(draft, { ...saved, elevationM: 7 });
    expect(joined).toMatchObject({ elevation: '7', latitude: '12° 75′ N', name: saved.name });
  });
});
