import { FirstSchema1796000000000 } from './1796000000000-first-schema.js';
import { Letters1796200000000 } from './1796200000000-letters.js';

/** In the order in which they run. */
export const MIGRATIONS = [FirstSchema1796000000000, Letters1796200000000];
