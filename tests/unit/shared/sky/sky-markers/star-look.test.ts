import { describe, expect, it } from 'vitest';

import { computeSkyMarker, type Figure, SkyRangeError, type SkyMarkerSpec } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const settings = settingsWith();
const BOWL: Figure = {
  key: 'f-seed-bowl',
  name: 'Seed bowl',
  indicatorHr: 1457,
  memberHrs: [1412, 1457],
  patch: null,
  thresholdOverride: null,
};
/** At the place of Antares at J2000. */
const CLOUD: Figure = {
  key: 'f-dark-cloud',
  name: 'The dark herd',
  indicatorHr: null,
  memberHrs: [],
  patch: { rightAscensionDeg: 247.35167, declinationDeg: -26.43194, patchClass: 'full-night' },
  thresholdOverride: null,
};

/** Every kind of sign that goes by a star. */
const signsOf = (markerKey: string): SkyMarkerSpec[] => [
  { kind: 'culmination', markerKey, twilight: 'dusk', depthDeg: 18 },
  {
    kind: 'star-altitude',
    markerKey,
    altitudeDeg: 30,
    side: 'east',
    at: { clock: 'solar-hour', solarHour: 22 },
  },
  { kind: 'due-meridian', markerKey, facing: 'south', solarHour: 22 },
  { kind: 'about-pole', markerKey, position: 'highest', solarHour: 22 },
  { kind: 'moon-counted', markerKey, phenomenon: 'heliacal-rising', event: 'full', count: 2 },
];

describe('a community’s own figure as a sign of the sky', () => {
  it.each(signsOf(BOWL.key).map((spec) => [spec.kind, spec] as const))(
    'has the days of its leading star: %s',
    (_, spec) => {
      const site = siteAt(28, 84);
      const own = computeSkyMarker(spec, site, settings, 2027, [BOWL]);
      const star = computeSkyMarker({ ...spec, markerKey: 'hr1457' } as SkyMarkerSpec, site, settings, 2027);
      expect(own.outcome).toBe('dated');
      expect(own).toEqual({ ...star, spec });
    },
  );

  it('that is a patch of sky has a direction, so it culminates with a star at the same place', () => {
    const site = siteAt(28, 84);
    for (const spec of signsOf(CLOUD.key).slice(0, 4)) {
      const patch = computeSkyMarker(spec, site, settings, 2027, [CLOUD]);
      const star = computeSkyMarker({ ...spec, markerKey: 'hr6134' } as SkyMarkerSpec, site, settings, 2027);
      expect(patch.outcome, spec.kind).toBe('dated');
      // Antares has moved by a second of arc since.
      expect(patch.occurrences.map(({ expected }) => expected.dayNumber)).toEqual(
        star.occurrences.map(({ expected }) => expected.dayNumber),
      );
    }
  });

  it('that is a patch for a full night is not shown in twilight: the reason says so', () => {
    const twilight: SkyMarkerSpec = {
      kind: 'culmination',
      markerKey: CLOUD.key,
      twilight: 'dusk',
      depthDeg: 6,
    };
    expect(computeSkyMarker(twilight, siteAt(12), settings, 2027, [CLOUD])).toMatchObject({
      outcome: 'never-here',
      reason: 'too-light',
    });
  });

  it('is unknown where it is not handed over', () => {
    for (const spec of signsOf(BOWL.key))
      expect(() => computeSkyMarker(spec, siteAt(12), settings, 2027)).toThrow(SkyRangeError);
  });
});
