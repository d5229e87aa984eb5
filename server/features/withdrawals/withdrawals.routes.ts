import { withdrawalsEndpoints } from '#shared/contracts/withdrawals.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { ItemStatesService } from './item-states.service.js';
import type { WithdrawalsService } from './withdrawals.service.js';

export function withdrawalsRoutes(
  mount: Mount,
  withdrawals: WithdrawalsService,
  states: ItemStatesService,
): void {
  mount.forMember(withdrawalsEndpoints.readState, ({ params }, actor) =>
    states.read(actor, params.itemType, params.itemId),
  );
  mount.forMember(withdrawalsEndpoints.withdraw, async ({ params, body }, actor) => {
    await withdrawals.withdraw(actor, params.itemType, params.itemId, body);
    return undefined;
  });
  mount.forMember(withdrawalsEndpoints.pause, async ({ params, body }, actor) => {
    await withdrawals.pause(actor, params.itemType, params.itemId, body.askedById);
    return undefined;
  });
  mount.forMember(withdrawalsEndpoints.resume, async ({ params }, actor) => {
    await withdrawals.resume(actor, params.itemType, params.itemId);
    return undefined;
  });
  mount.forMember(withdrawalsEndpoints.takeNameOff, async ({ params }, actor) => {
    await withdrawals.takeNameOff(actor, params.itemType, params.itemId);
    return undefined;
  });
  mount.forMember(withdrawalsEndpoints.removeSound, async ({ params, body }, actor) => {
    await withdrawals.removeSound(actor, params.itemId, body.askedById);
    return undefined;
  });
  mount.forMember(withdrawalsEndpoints.listPaused, async (_call, actor) =>
    wholeList(await states.listPaused(actor)),
  );
  mount.forMember(withdrawalsEndpoints.listWithdrawn, async (_call, actor) =>
    wholeList(await withdrawals.listGone(actor)),
  );
  mount.forMember(withdrawalsEndpoints.listSheets, async (_call, actor) =>
    wholeList(await withdrawals.listSheets(actor)),
  );
  mount.forMember(withdrawalsEndpoints.sheetReplaced, async ({ params }, actor) => {
    await withdrawals.markReplaced(actor, params.withdrawalId);
    return undefined;
  });
}
