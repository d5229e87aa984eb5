import { importsEndpoints } from '#shared/contracts/imports.js';
import type { Mount } from '../../http/mount.js';
import type { FileImportService } from './file-import.service.js';
import type { TableImportService } from './table-import.service.js';

export function importsRoutes(mount: Mount, files: FileImportService, tables: TableImportService): void {
  mount.forMemberUpload(importsEndpoints.file, ({ params, body }, actor, file) =>
    files.bringIn(actor, params.calendarId, body, file),
  );
  mount.forMember(importsEndpoints.table, ({ params, body }, actor) =>
    tables.bringIn(actor, params.calendarId, body),
  );
}
