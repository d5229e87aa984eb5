import { exportsEndpoints } from '#shared/contracts/exports.js';
import type { Router } from 'express';
import { FileReply, StoredFileReply, StreamedFileReply } from '../../http/file-reply.js';
import { feedLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { ExportsService } from './exports.service.js';
import { feedFile } from './feed-file.js';
import type { FeedsService } from './feeds.service.js';

export function exportsRoutes(
  router: Router,
  mount: Mount,
  files: ExportsService,
  feeds: FeedsService,
): void {
  router.get(exportsEndpoints.readFeed.path, ...feedLimits());

  mount.forMember(exportsEndpoints.ics, async ({ params, query }, actor) => {
    const { content, fileName } = await files.ics(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
  mount.forMember(exportsEndpoints.csv, async ({ params, query }, actor) => {
    const { content, fileName } = await files.csv(actor, params.calendarId, params.number, query);
    return new FileReply(content, fileName);
  });
  mount.forMember(exportsEndpoints.json, async ({ params }, actor) => {
    const { content, fileName } = await files.json(actor, params.calendarId, params.number);
    return new FileReply(content, fileName);
  });
  mount.forMember(exportsEndpoints.takeAlong, ({ params }, actor) =>
    files.takeAlong(actor, params.calendarId, params.number),
  );
  mount.forMember(
    exportsEndpoints.archive,
    async ({ params }, actor) =>
      new StreamedFileReply(await files.archive(actor, params.calendarId, params.number)),
  );
  mount.forMember(exportsEndpoints.listFeeds, async (_call, actor) => wholeList(await feeds.list(actor)));
  mount.forMember(exportsEndpoints.makeFeed, (_call, actor) => feeds.make(actor));
  mount.forMember(exportsEndpoints.endFeed, async ({ params }, actor) => {
    await feeds.end(actor, params.feedId);
    return undefined;
  });
  mount.forAnybody(
    exportsEndpoints.readFeed,
    async ({ query }) => new StoredFileReply(feedFile(await feeds.fetch(query.key))),
  );
}
