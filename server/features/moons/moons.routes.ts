import { moonsEndpoints } from '#shared/contracts/moons.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import type { MoonsService } from './moons.service.js';

export function moonsRoutes(mount: Mount, moons: MoonsService): void {
  mount.forMember(moonsEndpoints.read, ({ params, query }, actor) =>
    moons.read(actor, params.placeId, query),
  );
  mount.forMember(moonsEndpoints.csv, async ({ params, query }, actor) => {
    const { text, fileName } = await moons.csv(actor, params.placeId, query);
    return new FileReply(text, fileName);
  });
}
