import { CalendarsPage } from '#src/features/calendars/components/calendars-page.js';
import { NextYear } from '#src/features/rollovers/components/next-year.js';

export function Component() {
  return <CalendarsPage next={(calendars) => <NextYear {...calendars} />} />;
}
