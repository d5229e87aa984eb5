import { starsEndpoints } from '#shared/contracts/stars.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import { PreparedReplies, wholeList } from '../../http/reply.js';
import type { SkylineEffectsService } from './skyline-effects.service.js';
import type { StarsService } from './stars.service.js';

export function starsRoutes(mount: Mount, stars: StarsService, skylineEffects: SkylineEffectsService): void {
  const tables = new PreparedReplies(starsEndpoints.list);
  mount.forMember(starsEndpoints.list, async ({ params, query }, actor) => {
    const table = await stars.list(actor, params.placeId, query.year);
    return tables.of(table, table.items);
  });
  mount.forMember(starsEndpoints.csv, async ({ params, query }, actor) => {
    const { text, fileName } = await stars.csv(actor, params.placeId, query.year);
    return new FileReply(text, fileName);
  });
  mount.forMember(starsEndpoints.read, ({ params, query }, actor) =>
    stars.read(actor, params.placeId, params.markerKey, query.year),
  );
  mount.forMember(starsEndpoints.skylineEffects, async ({ params, query }, actor) =>
    wholeList(await skylineEffects.ofPlace(actor, params.placeId, query.year)),
  );
  mount.forMember(starsEndpoints.previewSkylineEffects, ({ body }) =>
    wholeList(skylineEffects.of(body.place, body.year)),
  );
}
