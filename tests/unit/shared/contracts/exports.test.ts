import { expect, it } from 'vitest';
import { CSV_LANGUAGES } from '#shared/contracts/exports.js';
import { TABLE_LANGUAGES } from '#shared/locales/table-languages.js';

it('offers tables in every language in which they can be read back', () => {
  expect(CSV_LANGUAGES).toEqual(TABLE_LANGUAGES);
});
