import { useMediaQuery } from './media-query.js';

/** The width from which the rail stands on top and screens have columns (`--breakpoint-wide`). */
const FROM_WIDE = '(min-width: 64rem)';

/** True from 1024 px. For screens whose parts stand side by side there, and one behind the other on a phone. */
export function useWideScreen(): boolean {
  return useMediaQuery(FROM_WIDE);
}
