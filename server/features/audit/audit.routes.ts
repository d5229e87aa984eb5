import { auditEndpoints } from '#shared/contracts/audit.js';
import type { Mount } from '../../http/mount.js';
import type { AuditListService } from './audit-list.service.js';

export function auditRoutes(mount: Mount, audit: AuditListService): void {
  mount.forMember(auditEndpoints.list, ({ query }, actor) => audit.list(actor, query));
}
