/**
 * Sizes of type on the boards. A role's floor is never broken: what does not fit moves to another place.
 *
 * The floors come from reading distance. At 1.5 m a letter of about 2.2 mm can just be told by sound eyes
 * (5 minutes of arc); dim rooms and elders' eyes need twice that, comfort twice again: 8.7 mm, floor 7.5 mm.
 * For reading in the hand, clear-print advice asks for 14 points and never less than 12.
 * Andika's capitals are 0.713 of the type size high: 30 pt = 7.5 mm, 20 pt = 5.0 mm, 40 pt = 10.1 mm.
 */
export const TYPE_FLOORS_PT = {
  'month-name': 40,
  'event-name': 30,
  'day-number': 20,
  'version-figure': 79.6,
  'version-year': 20,
  watermark: 40,
  'legend-name': 14,
  legend: 14,
  weekday: 14,
  'moon-date': 14,
  'moon-day': 12,
  foot: 12,
  tag: 12,
  'tile-code': 8,
  glue: 8,
} as const;

export type TextRole = keyof typeof TYPE_FLOORS_PT;

/** Height of capitals and figures of the boards' type, in ems. Measured on Andika 6.101, both weights. */
export const CAP_HEIGHT_EM = 0.7129;

/** Room that letters with stacked marks take above and below the baseline, in ems. */
export const ASCENT_EM = 1.02;
export const DESCENT_EM = 0.36;
