import { sharingEndpoints } from '#shared/contracts/sharing.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { GroupsService } from './groups.service.js';
import type { ItemSharingService } from './item-sharing.service.js';

export function sharingRoutes(mount: Mount, groups: GroupsService, items: ItemSharingService): void {
  mount.forMember(sharingEndpoints.listGroups, async (_call, actor) => wholeList(await groups.list(actor)));
  mount.forMember(sharingEndpoints.addGroup, ({ body }, actor) => groups.add(actor, body));
  mount.forMember(sharingEndpoints.updateGroup, ({ params, body }, actor) =>
    groups.update(actor, params.groupId, body),
  );
  mount.forMember(sharingEndpoints.listAsked, async (_call, actor) =>
    wholeList(await items.listAsked(actor)),
  );
  mount.forMember(sharingEndpoints.readSharing, ({ params }, actor) =>
    items.read(actor, params.itemType, params.itemId),
  );
  mount.forMember(sharingEndpoints.changeSharing, ({ params, body }, actor) =>
    items.change(actor, params.itemType, params.itemId, body),
  );
  mount.forMember(sharingEndpoints.agreeWider, ({ params }, actor) =>
    items.agree(actor, params.itemType, params.itemId),
  );
  mount.forMember(sharingEndpoints.dropWider, ({ params }, actor) =>
    items.drop(actor, params.itemType, params.itemId),
  );
}
