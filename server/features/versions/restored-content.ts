import type { EntryInput } from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { withoutGiver } from '../../policy/giver-naming.js';

/**
 * An entry as a version of old says it, under what holds for it today: who may see it, whose it is, and which timing
 * drives the board are not brought back by an old text, and neither is a yes to print that was taken back since.
 */
export function restoredContent(frozen: EntryInput, today: EntryInput): EntryInput {
  const { sharing: _sharing, giverId: _giverId, board: _board, ...old } = frozen;
  const named = old.giver === today.giver ? old : withoutGiver(old, today.giver);
  return {
    ...named,
    sharingLevel: today.sharingLevel,
    agreedToPrint: frozen.agreedToPrint && today.agreedToPrint,
    ...(today.sharing !== undefined && { sharing: today.sharing }),
    ...(today.giverId !== undefined && { giverId: today.giverId }),
    ...(today.board !== undefined && { board: today.board }),
  };
}

/** Was it shared otherwise, or given by somebody else, than it is today? */
export function sharedOtherwise(frozen: EntryInput, today: EntryInput): boolean {
  const said = ({ sharingLevel, sharing, giver, giverId }: EntryInput) => [
    ...[sharingLevel, sharing ?? null, giver, giverId ?? null],
  ];
  return !sameJson(said(frozen), said(today));
}
