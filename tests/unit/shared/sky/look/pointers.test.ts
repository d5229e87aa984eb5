import { describe, expect, it } from 'vitest';

import { whereToLook } from '#shared/sky/index.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

const JD_2027_01_01 = 2_461_407;
const look = (key: string, dayOfYear: number, side: 'dawn' | 'dusk', latitudeDeg = 12) =>
  whereToLook(key, siteAt(latitudeDeg, 39), settingsWith(), JD_2027_01_01 + dayOfYear - 1, side);

describe('stars to start from', () => {
  it('are bright ones within two and a half hands that can be seen at the same moment, brightest first', () => {
    // In September before dawn the Pleiades stand high, with Aldebaran a hand and a half away.
    const { pointers, best } = look('pleiades', 244, 'dawn');
    expect(pointers[0]).toMatchObject({ name: 'Aldebaran', hr: 1457 });
    expect(pointers.length).toBeLessThanOrEqual(3);
    expect(best?.isSeen).toBe(true);
    for (const pointer of pointers) {
      expect(pointer.separationDeg).toBeLessThanOrEqual(25);
      expect(pointer.aboveSkylineDeg).toBeGreaterThan(0);
      expect(pointer.vMag).toBeLessThanOrEqual(2.6);
    }
    expect([...pointers].sort((a, b) => a.vMag - b.vMag)).toEqual(pointers);
  });

  it('lie as far from the star as the catalogue has them', () => {
    // Aldebaran to Alcyone by their J2000 places (RA 4h35m55s, Dec +16.51°; 3h47m29s, +24.11°): 13.7°.
    expect(look('pleiades', 244, 'dawn').pointers[0]?.separationDeg).toBeCloseTo(13.7, 1);
  });

  it('are never the figure’s own stars', () => {
    const { pointers } = look('orion-belt', 260, 'dawn');
    expect(pointers.map(({ hr }) => hr)).not.toContain(1852);
    expect(pointers.map(({ hr }) => hr)).not.toContain(1948);
    expect(pointers.length).toBeGreaterThan(0);
  });

  it('that are lost in the light themselves point nowhere', () => {
    // On the first mornings of the Pleiades Aldebaran has not come up yet.
    const { pointers } = look('pleiades', 160, 'dawn');
    expect(pointers.map(({ name }) => name)).not.toContain('Aldebaran');
  });

  it('may be one of the very brightest, further away, where nothing stands near', () => {
    const far = look('hr5056', 273, 'dusk').pointers;
    expect(far).toHaveLength(1);
    expect(far[0]?.separationDeg).toBeGreaterThan(25);
    expect(far[0]?.vMag).toBeLessThanOrEqual(1);
  });
});
