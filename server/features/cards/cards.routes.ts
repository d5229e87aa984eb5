import { cardsEndpoints } from '#shared/contracts/cards.js';
import { FileReply } from '../../http/file-reply.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { CardPrintService } from './card-print.service.js';
import type { CardsService } from './cards.service.js';

/** Signing in by card stands with the other doors, in the session's routes. */
export function cardsRoutes(mount: Mount, cards: CardsService, prints: CardPrintService): void {
  mount.forMember(cardsEndpoints.list, async (_call, actor) => wholeList(await cards.list(actor)));
  mount.forMember(cardsEndpoints.make, ({ params }, actor) => cards.make(actor, params.personId));
  mount.forMember(cardsEndpoints.print, async ({ params, body }, actor) => {
    const { content, fileName } = await prints.pdf(actor, params.personId, body);
    return new FileReply(content, fileName);
  });
  mount.forMember(cardsEndpoints.end, async ({ params }, actor) => {
    await cards.end(actor, params.personId);
    return undefined;
  });
}
