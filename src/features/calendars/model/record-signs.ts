import type { EventRecord } from '#shared/contracts/event-record.js';

type Signs = EventRecord['signs'];

/** Without one sign of the list. The one that must be there stays the same, and no more are needed than are left. */
export function withoutSign({ list, needed, mustHave }: Signs, index: number): Signs {
  const left = list.filter((_, place) => place !== index);
  const own = mustHave === null || mustHave === index ? null : mustHave - (mustHave > index ? 1 : 0);
  const count = needed === null || left.length === 0 ? null : Math.min(needed, left.length);
  return { list: left, needed: count, mustHave: own };
}
