import type { EntityManager } from 'typeorm';
import {
  appearance,
  isForVillage,
  isKept,
  isOpen,
  isOfItsPeople,
  maySee,
  type Appearance,
  type Shared,
} from './policy.js';
import { sharedById } from './sharing.repository.js';
import type { Viewer } from './viewer.js';

/** An entry as the policy asks about it: its id, and the star or figure that it goes by. */
export interface SeenThing {
  entryId: string;
  markerKey: string | null;
}

/** What one person sees of entries. An entry is never wider than the village's own figure that it goes by. */
export interface EntrySight {
  appearance(thing: SeenThing): Appearance;
  /** On the village's board, in its counts and its sign-off. */
  isForVillage(thing: SeenThing): boolean;
  /** For everybody, the village's own people or not. */
  isOpen(thing: SeenThing): boolean;
  /** Answered by its own people. */
  isKept(thing: SeenThing): boolean;
  /** Kept, and the person is one of those who keep it and answer for it. */
  isOfItsPeople(thing: SeenThing): boolean;
  sharedOf(entryId: string): Shared | undefined;
}

const OWN_FIGURE = /^f-(.+)$/u;

export async function entrySight(
  manager: EntityManager,
  viewer: Viewer,
  things: readonly SeenThing[],
  /** Variants are asked about as entries are, with their own rows. */
  itemType: 'entry' | 'variant' = 'entry',
): Promise<EntrySight> {
  const { both, sharedOf } = await sharedOfThings(manager, things, itemType);
  return {
    appearance: (thing) =>
      both(thing)
        .map((shared) => appearance(viewer, shared))
        .reduce(narrower),
    isForVillage: (thing) => both(thing).every((shared) => isForVillage(shared, viewer.today)),
    isOpen: (thing) => both(thing).every((shared) => isOpen(shared, viewer.today)),
    isKept: (thing) => both(thing).some(standsApart),
    isOfItsPeople: (thing) =>
      both(thing).some(standsApart) &&
      both(thing).every((shared) =>
        standsApart(shared) ? isOfItsPeople(viewer, shared) : maySee(viewer, shared),
      ),
    sharedOf,
  };
}

/** Entries that their own people answer for, whoever asks. */
export async function keptEntryIds(
  manager: EntityManager,
  things: readonly SeenThing[],
): Promise<Set<string>> {
  const { both } = await sharedOfThings(manager, things, 'entry');
  const kept = things.filter((thing) => both(thing).some(standsApart));
  return new Set(kept.map(({ entryId }) => entryId));
}

/** Not the village's to answer: kept by its people, paused, or nothing is known about it. */
function standsApart(shared: Shared | undefined): boolean {
  return shared?.state !== 'shared' || isKept(shared);
}

async function sharedOfThings(
  manager: EntityManager,
  things: readonly SeenThing[],
  itemType: 'entry' | 'variant',
) {
  const entries = await sharedById(
    manager,
    itemType,
    things.map(({ entryId }) => entryId),
  );
  const figures = await sharedById(
    manager,
    'figure',
    things.flatMap(({ markerKey }) => figureIdOf(markerKey) ?? []),
  );
  return {
    /** The thing itself and, where it goes by one, the village's figure. */
    both: ({ entryId, markerKey }: SeenThing): (Shared | undefined)[] => {
      const figureId = figureIdOf(markerKey);
      const figure = figureId === null ? undefined : figures.get(figureId);
      // Of a figure that was withdrawn nothing is left that could tell: its entries go by a star's own name.
      const counts = figureId !== null && figure?.state !== 'withdrawn';
      return [entries.get(entryId), ...(counts ? [figure] : [])];
    },
    sharedOf: (entryId: string) => entries.get(entryId),
  };
}

export function figureIdOf(markerKey: string | null): string | null {
  return OWN_FIGURE.exec(markerKey ?? '')?.[1] ?? null;
}

function narrower(a: Appearance, b: Appearance): Appearance {
  const order: readonly Appearance[] = ['none', 'blank', 'full'];
  return order.indexOf(a) < order.indexOf(b) ? a : b;
}
