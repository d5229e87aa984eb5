import { variantsEndpoints } from '#shared/contracts/variants.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { VariantsService } from './variants.service.js';

export function variantsRoutes(mount: Mount, variants: VariantsService): void {
  mount.forMember(variantsEndpoints.list, async ({ params }, actor) =>
    wholeList(await variants.list(actor, params.calendarId, params.entryId)),
  );
  mount.forMember(variantsEndpoints.add, ({ params, body }, actor) =>
    variants.add(actor, params.calendarId, params.entryId, body),
  );
  mount.forMember(variantsEndpoints.update, ({ params, body }, actor) =>
    variants.update(actor, params, body),
  );
  mount.forMember(variantsEndpoints.remove, async ({ params }, actor) => {
    await variants.remove(actor, params.calendarId, params.entryId, params.variantId);
    return undefined;
  });
}
