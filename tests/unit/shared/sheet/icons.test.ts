import { describe, expect, it } from 'vitest';
import { ENTRY_ICONS } from '#shared/contracts/calendars.js';
import { ICON_BOX_UNITS, ICON_KEYS, ICONS, isIconKey } from '#shared/sheet/icons.js';

describe('the drawn signs', () => {
  it('exist for every picture that an entry can carry', () => {
    expect(ENTRY_ICONS.filter((icon) => !isIconKey(icon))).toEqual([]);
  });

  it.each(ICON_KEYS)('%s stays inside its square and keeps lines of 0.4 mm at 10 mm', (key) => {
    const { fill, strokes } = ICONS[key];
    expect(fill !== '' || strokes.length > 0).toBe(true);
    for (const stroke of strokes) expect((stroke.width / ICON_BOX_UNITS) * 10).toBeGreaterThanOrEqual(0.39);
    for (const [x, y] of endPoints([fill, ...strokes.map(({ d }) => d)].join(''))) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(ICON_BOX_UNITS);
      expect(y).toBeGreaterThanOrEqual(0);
      expect(y).toBeLessThanOrEqual(ICON_BOX_UNITS);
    }
  });

  it('know their own names only', () => {
    expect(isIconKey('sow')).toBe(true);
    expect(isIconKey('toString')).toBe(false);
  });
});

/** Where the absolute commands of our path data end. */
function endPoints(d: string): [number, number][] {
  const points: [number, number][] = [];
  let x = 0;
  let y = 0;
  for (const [, command = '', rest = ''] of d.matchAll(/([MLHVCAZ])([^MLHVCAZ]*)/gu)) {
    const numbers = rest.match(/-?\d*\.?\d+/gu)?.map(Number) ?? [];
    const size = { M: 2, L: 2, H: 1, V: 1, C: 6, A: 7, Z: 0 }[command] ?? 0;
    for (let at = 0; size > 0 && at + size <= numbers.length; at += size) {
      if (command === 'H') x = numbers[at] ?? 0;
      else if (command === 'V') y = numbers[at] ?? 0;
      else [x, y] = [numbers[at + size - 2] ?? 0, numbers[at + size - 1] ?? 0];
      points.push([x, y]);
    }
  }
  return points;
}
