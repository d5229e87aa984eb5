import { wordListsEndpoints } from '#shared/contracts/word-lists.js';
import type { Mount } from '../../http/mount.js';
import type { WordListsService } from './word-lists.service.js';

export function wordListsRoutes(mount: Mount, words: WordListsService): void {
  mount.forMember(wordListsEndpoints.read, (_call, actor) => words.read(actor));
  mount.forMember(wordListsEndpoints.save, ({ params, body }, actor) => words.save(actor, params.list, body));
}
