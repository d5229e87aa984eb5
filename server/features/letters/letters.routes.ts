import { lettersEndpoints } from '#shared/contracts/letters.js';
import type { Router } from 'express';
import { letterLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { LetterChoicesService } from './letter-choices.service.js';
import type { LettersService } from './letters.service.js';

export function lettersRoutes(
  router: Router,
  mount: Mount,
  letters: LettersService,
  choices: LetterChoicesService,
): void {
  router.post(lettersEndpoints.askForReset.path, ...letterLimits());

  mount.forAnybody(lettersEndpoints.readService, () => ({ on: letters.on }));
  mount.forAnybody(lettersEndpoints.askForReset, async ({ body }) => {
    await letters.askForReset(body.email);
    return undefined;
  });
  mount.forPerson(lettersEndpoints.readChoice, (_call, person) => choices.read(person));
  mount.forPerson(lettersEndpoints.saveChoice, ({ body }, person) => choices.save(person, body));
  mount.forMember(lettersEndpoints.invite, async ({ params }, actor) => {
    await letters.invite(actor, params.personId);
    return undefined;
  });
  mount.forMember(lettersEndpoints.listStillToAsk, async (_call, actor) =>
    wholeList(await letters.stillToAsk(actor)),
  );
}
