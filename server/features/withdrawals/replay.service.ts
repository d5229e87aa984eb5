import type { DataSource } from 'typeorm';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { WithdrawalEntity } from '../../db/entities/withdrawal.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { WithdrawalList } from '../../storage/withdrawal-list.js';
import { hasSound } from '../attachments/attachment-eraser.service.js';
import type { Eraser } from './eraser.service.js';
import { vanish } from './vanishing.service.js';

/**
 * At every start: what the list names and the tables hold again, because somebody restored an older copy of them,
 * vanishes once more; and what the tables know and a broken end kept from the list is added to it.
 * @returns how many things vanished anew
 */
export async function replayWithdrawals(
  dataSource: DataSource,
  erasers: readonly Eraser[],
  list: WithdrawalList,
): Promise<number> {
  const listed = await list.all();
  const known = new Set(
    listed.filter(({ part }) => part === 'all').map(({ itemType, itemId }) => `${itemType} ${itemId}`),
  );
  for (const { itemType, itemId, communityId, at } of await dataSource.manager.find(WithdrawalEntity)) {
    if (known.has(`${itemType} ${itemId}`)) continue;
    const row = await dataSource.manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    const leavesTrace = row?.leavesTrace ?? false;
    await list.add({ itemType, itemId, communityId, leavesTrace, part: 'all', at: at.toISOString() });
  }
  let vanishedAnew = 0;
  for (const { itemType, itemId, communityId, leavesTrace, part, at } of listed) {
    const back = await dataSource.manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    if (back === null || back.state === 'withdrawn') continue;
    if (part === 'sound' && !(await hasSound(dataSource.manager, itemId))) continue;
    const { afterwards } = await inTransaction(dataSource, (manager) =>
      vanish(manager, erasers, { itemType, itemId, communityId, leavesTrace, part, at: new Date(at) }),
    );
    for (const finish of afterwards) await finish();
    vanishedAnew += 1;
  }
  return vanishedAnew;
}
