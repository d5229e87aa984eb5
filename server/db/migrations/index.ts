import { FirstSchema1796000000000 } from './1796000000000-first-schema.js';

/** In the order in which they run. */
export const MIGRATIONS = [FirstSchema1796000000000];
