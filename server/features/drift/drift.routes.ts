import { driftEndpoints } from '#shared/contracts/drift.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { DriftService } from './drift.service.js';

export function driftRoutes(mount: Mount, drift: DriftService): void {
  mount.forMember(driftEndpoints.read, ({ params, query }, actor) =>
    drift.read(actor, params.placeId, params.markerKey, query),
  );
  mount.forMember(driftEndpoints.csv, async ({ params, query }, actor) => {
    const { text, fileName } = await drift.csv(actor, params.placeId, params.markerKey, query);
    return new FileReply(text, fileName);
  });
}
