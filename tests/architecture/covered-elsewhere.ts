/**
 * Files of shared/ whose behaviour is held by a test at another place: the door they are used through says
 * more about them than a test of their own would.
 */
export const coveredElsewhere: Readonly<Record<string, string>> = {
  'shared/contracts/consents.ts': 'tests/api/consents.test.ts',
  'shared/contracts/sharing.ts': 'tests/api/sharing.test.ts',
  'shared/contracts/word-lists.ts': 'tests/api/word-lists.test.ts',
  'shared/calendar/day-grounds.ts': 'tests/unit/shared/calendar/why-moved.test.ts',
  'shared/sheet/bar-legend.ts': 'tests/unit/shared/sheet/month-card.test.ts',
  'shared/sheet/board-names.ts': 'tests/unit/shared/sheet/year-board.test.ts',
  'shared/sheet/card-page.ts': 'tests/unit/shared/sheet/month-card.test.ts',
  'shared/sheet/day-row.ts': 'tests/unit/shared/sheet/month-card.test.ts',
  'shared/sheet/month-head.ts': 'tests/unit/shared/sheet/month-card.test.ts',
  'shared/sheet/month-words.ts': 'tests/unit/shared/sheet/month-card.test.ts',
  'shared/sheet/page-foot.ts': 'tests/unit/shared/sheet/layout-sheet.test.ts',
  'shared/sheet/strokes.ts': 'tests/unit/shared/sheet/page-paths.test.ts',
  'shared/sheet/tick-circles.ts': 'tests/unit/shared/sheet/layout-sheet.test.ts',
  'shared/sheet/tile-frame.ts': 'tests/unit/shared/sheet/year-board.test.ts',
  'shared/sheet/units.ts': 'tests/unit/shared/sheet/page-paths.test.ts',
  'shared/sheet/version-figure.ts': 'tests/unit/shared/sheet/layout-sheet.test.ts',
  'shared/sheet/watermark.ts': 'tests/unit/shared/sheet/layout-sheet.test.ts',
  'shared/sheet/watch-card-picture.ts': 'tests/unit/shared/sheet/watch-card.test.ts',
  'shared/sheet/watch-card-scale.ts': 'tests/unit/shared/sheet/watch-card.test.ts',
  'shared/sheet/year-legend.ts': 'tests/unit/shared/sheet/year-board.test.ts',
  'shared/sheet/year-tiles.ts': 'tests/unit/shared/sheet/year-board.test.ts',
  'shared/sky/look/body-places.ts': 'tests/reference/against-ephem-bodies.test.ts',
  'shared/sky/look/look-path.ts': 'tests/unit/shared/sky/look/look-at.test.ts',
  'shared/sky/look/sky-at.ts': 'tests/reference/against-erfa-horizontal.test.ts',
  'shared/sky/phenomena/sun-place.ts': 'tests/unit/shared/sky/phenomena/sun-day.test.ts',
  'shared/sky/sky-markers/kind.ts': 'tests/unit/shared/sky/sky-markers/sky-marker-year.test.ts',
  'shared/sky/sky-markers/sky-hour.ts': 'tests/unit/shared/sky/sky-markers/sky-marker-year.test.ts',
  'shared/sky/sky-markers/spec-checks.ts': 'tests/unit/shared/sky/sky-markers/sky-marker-year.test.ts',
};
