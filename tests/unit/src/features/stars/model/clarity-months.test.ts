import { expect, it } from 'vitest';
import { monthsByClarity } from '#src/features/stars/model/clarity-months.js';

it('months are gathered by how clear their air is, none lost', () => {
  const months = monthsByClarity([...Array.from({ length: 11 }, () => 'hazy' as const), 'clear']);
  expect(months).toEqual({ clear: [11], ordinary: [], hazy: [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10] });
});
