import { peopleEndpoints } from '#shared/contracts/people.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { CommunitiesService } from './communities.service.js';
import type { PeopleService } from './people.service.js';

export function peopleRoutes(mount: Mount, people: PeopleService, communities: CommunitiesService): void {
  mount.forPerson(peopleEndpoints.listCommunities, async (_call, person) =>
    wholeList(await communities.listOf(person)),
  );
  mount.forMember(peopleEndpoints.readCommunity, (_call, actor) => communities.read(actor));
  mount.forMember(peopleEndpoints.updateCommunity, ({ body }, actor) => communities.update(actor, body));
  mount.forMember(peopleEndpoints.listPeople, async (_call, actor) => wholeList(await people.list(actor)));
  mount.forMember(peopleEndpoints.addPerson, ({ body }, actor) => people.add(actor, body));
  mount.forMember(peopleEndpoints.updatePerson, ({ params, body }, actor) =>
    people.setRoles(actor, params.personId, body),
  );
  mount.forMember(peopleEndpoints.renewCode, ({ params }, actor) => people.renewCode(actor, params.personId));
  mount.forMember(peopleEndpoints.removePerson, async ({ params }, actor) => {
    await people.remove(actor, params.personId);
    return undefined;
  });
}
