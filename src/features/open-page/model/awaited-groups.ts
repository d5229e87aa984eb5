import type { AwaitedOfOpenPage, LeftOutOfOpenPage } from '#shared/contracts/open-page.js';

/** In the order in which they are told: what one question mends first. */
const ORDER = [
  { itemType: 'entry', what: 'nobody-asked' },
  { itemType: 'entry', what: 'no-answer' },
  { itemType: 'entry', what: 'not-agreed' },
  { itemType: 'figure', what: 'not-open' },
  { itemType: 'figure', what: 'nobody-asked' },
  { itemType: 'figure', what: 'no-answer' },
  { itemType: 'figure', what: 'not-agreed' },
] as const satisfies readonly Pick<AwaitedOfOpenPage, 'itemType' | 'what'>[];

/** One thing to ask about, and the entries that wait for it. */
export interface AwaitedThing {
  itemId: string;
  titles: string[];
}

export type AwaitedGroup = (typeof ORDER)[number] & { things: AwaitedThing[] };

/** What is waited for, each kind of it once: a figure that several entries go by is asked about once. */
export function awaitedGroups(leftOut: readonly LeftOutOfOpenPage[]): AwaitedGroup[] {
  return ORDER.map((kind) => {
    const titlesById = new Map<string, string[]>();
    for (const { title, awaited } of leftOut) {
      for (const { itemType, what, itemId } of awaited) {
        if (itemType !== kind.itemType || what !== kind.what) continue;
        titlesById.set(itemId, [...(titlesById.get(itemId) ?? []), title]);
      }
    }
    return { ...kind, things: [...titlesById].map(([itemId, titles]) => ({ itemId, titles })) };
  }).filter(({ things }) => things.length > 0);
}
