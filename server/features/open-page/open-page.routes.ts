import { openPageEndpoints } from '#shared/contracts/open-page.js';
import type { Router } from 'express';
import { FileReply } from '../../http/file-reply.js';
import { feedLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { OpenPageServices } from './open-page-services.js';

export function openPageRoutes(
  router: Router,
  mount: Mount,
  { pages, cards, leftOut, noNames }: OpenPageServices,
): void {
  router.get(openPageEndpoints.read.path, ...feedLimits(), (_request, response, next) => {
    response.setHeader('X-Robots-Tag', 'noindex, nofollow');
    next();
  });

  mount.forMember(openPageEndpoints.state, (_call, actor) => pages.state(actor));
  mount.forMember(openPageEndpoints.leftOut, async (_call, actor) => wholeList(await leftOut.list(actor)));
  mount.forMember(openPageEndpoints.sayNoName, async ({ body }, actor) => {
    await noNames.say(actor, body);
    return undefined;
  });
  mount.forMember(openPageEndpoints.takeBackNoName, async ({ params }, actor) => {
    await noNames.takeBack(actor, params.noNameId);
    return undefined;
  });
  mount.forMember(openPageEndpoints.switchOn, ({ body }, actor) => pages.switchOn(actor, body.placeShown));
  mount.forMember(openPageEndpoints.switchOff, async (_call, actor) => {
    await pages.switchOff(actor);
    return undefined;
  });
  mount.forMember(
    openPageEndpoints.code,
    async (_call, actor) => new FileReply(await cards.code(actor), 'open-page.svg', 'inline'),
  );
  mount.forMember(openPageEndpoints.card, async (_call, actor) => {
    const { content, fileName } = await cards.pdf(actor);
    return new FileReply(content, fileName, 'inline');
  });
  mount.forAnybody(openPageEndpoints.read, ({ query }) => pages.read(query.key));
}
