import { describe, expect, it } from 'vitest';
import type { LookMoment } from '#shared/contracts/look.js';
import { pathParts } from '#src/features/look/model/picture-parts.js';

/** `-` behind the skyline, `l` up in too light a sky, `s` seen. */
function pathOf(pattern: string): LookMoment[] {
  return Array.from(pattern, (kind, index) => ({
    localTime: `05:${String(index).padStart(2, '0')}`,
    azimuthDeg: 60 + index,
    altitudeDeg: index,
    aboveSkylineDeg: kind === '-' ? -1 : index,
    sunDepressionDeg: 12 - index,
    isUp: kind !== '-',
    isSeen: kind === 's',
  }));
}
const azimuths = (path: readonly { azimuthDeg: number }[]) => path.map(({ azimuthDeg }) => azimuthDeg - 60);

describe('the stretches of a path', () => {
  it('are thick while the star is seen and dotted while it is only up, joined without a gap', () => {
    const { seen, light } = pathParts(pathOf('--lsssll'));
    expect(seen.map(azimuths)).toEqual([[2, 3, 4, 5]]);
    expect(light.map(azimuths)).toEqual([[5, 6, 7]]);
  });

  it('end behind the skyline and begin anew after a hill', () => {
    const { seen, light } = pathParts(pathOf('ss-ssl'));
    expect(seen.map(azimuths)).toEqual([
      [0, 1],
      [3, 4],
    ]);
    expect(light.map(azimuths)).toEqual([[4, 5]]);
  });

  it('are none for a star that is not up', () => {
    expect(pathParts(pathOf('----'))).toEqual({ seen: [], light: [] });
    expect(pathParts([])).toEqual({ seen: [], light: [] });
  });
});
