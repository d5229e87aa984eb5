import { keepingSigns } from '#shared/calendar/signs-in.js';
import type { EventRecord } from '#shared/contracts/event-record.js';

type Signs = EventRecord['signs'];

/** Without one sign of the list. */
export function withoutSign(signs: Signs, index: number): Signs {
  return keepingSigns(signs, (_sign, place) => place !== index);
}
