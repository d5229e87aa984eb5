import { expect, it } from 'vitest';
import { textFits } from '#src/ui/combo-field.js';

it('finds a name whatever the capitals and marks that were typed', () => {
  expect(textFits('Ŋɔ́rɛ̃', 'ŋɔrɛ')).toBe(true);
  expect(textFits('Betelgeuse', 'GEUSE ')).toBe(true);
  expect(textFits('Betelgeuse', 'rigel')).toBe(false);
});
