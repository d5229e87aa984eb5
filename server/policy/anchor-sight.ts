import { isTighterOrSame } from '#shared/contracts/sharing-tightness.js';
import type { EntityManager } from 'typeorm';
import { figureIdOf, type SeenThing } from './entry-sight.js';
import { isKept, type Shared } from './policy.js';
import { sharedById } from './sharing.repository.js';

/**
 * May an entry be counted from another one? Its own days would tell of the other, so only where everybody who sees it may
 * see the other, and the village's figure that the other goes by, too. Asked anew whenever days are reckoned.
 */
export async function anchorSight(
  manager: EntityManager,
  things: readonly SeenThing[],
): Promise<(entryId: string, anchorId: string) => boolean> {
  const byId = new Map(things.map((thing) => [thing.entryId, thing]));
  const entries = await sharedById(manager, 'entry', [...byId.keys()]);
  const figures = await sharedById(
    manager,
    'figure',
    things.flatMap(({ markerKey }) => figureIdOf(markerKey) ?? []),
  );
  return (entryId, anchorId) => {
    const anchor = entries.get(anchorId);
    const figureId = figureIdOf(byId.get(anchorId)?.markerKey ?? null);
    const figure = figureId === null ? undefined : figures.get(figureId);
    if (figure && figure.state !== 'withdrawn' && (figure.state !== 'shared' || isKept(figure))) return false;
    return mayHangOn(entries.get(entryId), anchor);
  };
}

/** What the village sees may be hung on by anything; what is kept only by what the same giver keeps at least as close. */
export function mayHangOn(entry: Shared | undefined, anchor: Shared | undefined): boolean {
  if (entry === undefined || anchor?.state !== 'shared') return false;
  if (!isKept(anchor)) return true;
  const plain = { naming: 'named', trace: 'blank' } as const;
  return (
    entry.giverId === anchor.giverId &&
    isTighterOrSame(
      { level: anchor.level, details: { ...anchor.details, ...plain } },
      { level: entry.level, details: { ...entry.details, ...plain } },
    )
  );
}
