import { z } from 'zod';
import { id, line } from './common.js';

export const WORD_MAX_LENGTH = 80;

/**
 * What a village calls a kind of event or of work, as it stood when an entry was last read or frozen. With an id where it
 * is a word of the village's own; without one where it is its name for a built-in one.
 */
export const villageWord = z.strictObject({ id: id.optional(), word: line(WORD_MAX_LENGTH, 1) });
export type VillageWord = z.infer<typeof villageWord>;
