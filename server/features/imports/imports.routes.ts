import { importsEndpoints } from '#shared/contracts/imports.js';
import type { Mount } from '../../http/mount.js';
import type { CopyingService } from './copying.service.js';
import type { FileImportService } from './file-import.service.js';
import type { TableImportService } from './table-import.service.js';

interface Imports {
  files: FileImportService;
  tables: TableImportService;
  copying: CopyingService;
}

export function importsRoutes(mount: Mount, { files, tables, copying }: Imports): void {
  mount.forMemberUpload(importsEndpoints.file, ({ params, body }, actor, file) =>
    files.bringIn(actor, params.calendarId, body, file),
  );
  mount.forMember(importsEndpoints.table, ({ params, body }, actor) =>
    tables.bringIn(actor, params.calendarId, body),
  );
  mount.forMember(importsEndpoints.copy, ({ params, body }, actor) =>
    copying.copy(actor, params.calendarId, body),
  );
}
