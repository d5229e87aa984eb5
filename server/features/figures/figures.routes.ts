import { figuresEndpoints } from '#shared/contracts/figures.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import { readChart } from './chart.service.js';
import type { FiguresService } from './figures.service.js';

export function figuresRoutes(mount: Mount, figures: FiguresService): void {
  mount.forMember(figuresEndpoints.list, async (_call, actor) => wholeList(await figures.list(actor)));
  mount.forMember(figuresEndpoints.create, ({ body }, actor) => figures.create(actor, body));
  mount.forMember(figuresEndpoints.read, ({ params }, actor) => figures.read(actor, params.figureId));
  mount.forMember(figuresEndpoints.update, ({ params, body }, actor) =>
    figures.update(actor, params.figureId, body),
  );
  mount.forMember(figuresEndpoints.remove, async ({ params }, actor) => {
    await figures.remove(actor, params.figureId);
    return undefined;
  });
  mount.forMember(figuresEndpoints.restore, ({ params }, actor) => figures.restore(actor, params.figureId));
  mount.forPerson(figuresEndpoints.chart, () => readChart());
}
