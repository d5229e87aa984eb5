/** Minutes at which a column is full: longer than an hour no longer matters. */
const FULL_MINUTES = 60;
/** A single minute must stay visible. */
const LEAST_PX = 3;

/** Height of a day's column in a lane, pixels; 0 for a day on which the star does not show. */
export function columnHeightPx(minutes: number, laneHeightPx: number): number {
  if (minutes <= 0) return 0;
  return Math.max(LEAST_PX, Math.round((Math.min(minutes, FULL_MINUTES) / FULL_MINUTES) * laneHeightPx));
}
