import { expect, it } from 'vitest';
import { z } from 'zod';
import { newId } from '#src/lib/new-id.js';

it('makes ids that the server takes, each another one', () => {
  const ids = Array.from({ length: 50 }, newId);
  expect(ids.every((id) => z.uuidv4().safeParse(id).success)).toBe(true);
  expect(new Set(ids).size).toBe(50);
});
