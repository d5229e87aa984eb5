import { healthEndpoints } from '#shared/contracts/health.js';
import { ENGINE_VERSION } from '#shared/sky/vocabulary.js';
import type { Mount } from '../../http/mount.js';
import { openApiDocument } from '../../http/openapi.js';
import type { HealthService } from './health.service.js';

export function healthRoutes(mount: Mount, service: HealthService, productVersion: string): void {
  let document: Record<string, unknown> | null = null;
  mount.forAnybody(healthEndpoints.read, async () => {
    await service.expectDatabase();
    return { status: 'ok' as const, productVersion, engineVersion: ENGINE_VERSION };
  });
  mount.forAnybody(healthEndpoints.openapi, () => (document ??= openApiDocument(productVersion)));
}
