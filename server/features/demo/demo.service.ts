import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Clock } from '../../http/context.js';
import { hashPassword } from '../session/passwords.service.js';
import { seedDemoCalendar } from './demo-calendar.service.js';
import { seedNeighbourCalendars } from './demo-neighbours.service.js';
import {
  DEMO_DOMAIN,
  DEMO_PASSWORD,
  THOLMERE_LANDING,
  UPPER_TAZIMEL,
  VARDESCA_TERRACES,
  type DemoVillage,
} from './demo-villages.data.js';

/** Makes the demo villages where the database holds no person yet; what somebody changed in them stays. */
export async function seedDemo(dataSource: DataSource, clock: Clock): Promise<void> {
  await seedDemoVillages(dataSource, clock);
  await seedDemoCalendar(dataSource, clock);
  await seedNeighbourCalendars(dataSource, clock);
}

/** People, settings, places and figures only. */
export async function seedDemoVillages(dataSource: DataSource, clock: Clock): Promise<void> {
  if ((await dataSource.getRepository(PersonEntity).count()) > 0) return;
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  await inTransaction(dataSource, async (manager) => {
    for (const village of [UPPER_TAZIMEL, VARDESCA_TERRACES, THOLMERE_LANDING]) {
      await foundVillage(manager, village, passwordHash, clock.now());
    }
  });
}

/** True where somebody could sign in with the public demo password. */
export async function holdsDemoAccounts(dataSource: DataSource): Promise<boolean> {
  return dataSource.getRepository(PersonEntity).existsBy({ isDemo: true });
}

async function foundVillage(
  manager: EntityManager,
  { settings, rule, people, place, figures }: DemoVillage,
  passwordHash: string,
  createdAt: Date,
): Promise<void> {
  const communityId = randomUUID();
  const ids = new Map(people.map(({ mailbox }) => [mailbox, randomUUID()]));
  const idsOf = (mailboxes: string[]) => mailboxes.flatMap((mailbox) => ids.get(mailbox) ?? []);

  await manager.insert(CommunityEntity, {
    id: communityId,
    name: settings.name,
    villageLanguageTag: settings.villageLanguage.tag,
    villageLanguageName: settings.villageLanguage.name,
    officerLanguageTag: settings.officerLanguage.tag,
    officerLanguageName: settings.officerLanguage.name,
    yearStartMonth: settings.yearStart.date.month,
    yearStartDay: settings.yearStart.date.day,
    yearStartNote: settings.yearStart.note,
    localMonths: settings.localMonths,
    moonNames: settings.moonNames,
    weatherContact: settings.weatherContact,
    agricultureContact: settings.agricultureContact,
    signOffRule: { ...rule, mustSign: idsOf(rule.mustSign), oneOf: idsOf(rule.oneOf) },
    createdAt,
  });
  for (const { mailbox, displayName, roles, account } of people) {
    const personId = ids.get(mailbox) ?? randomUUID();
    await manager.insert(PersonEntity, {
      id: personId,
      email: `${mailbox}@${DEMO_DOMAIN}`,
      displayName,
      passwordHash: account ? passwordHash : null,
      isDemo: true,
      createdAt,
    });
    await manager.insert(MembershipEntity, { id: randomUUID(), personId, communityId, roles });
  }
  await manager.insert(PlaceEntity, { id: randomUUID(), communityId, ...place, createdAt });
  const officer = people.find(({ roles }) => roles.includes('officer'));
  const updatedBy = officer && ids.get(officer.mailbox);
  if (updatedBy === undefined) return;
  for (const figure of figures) {
    await manager.insert(FigureEntity, {
      id: randomUUID(),
      communityId,
      ...figure,
      takenOutAt: null,
      updatedBy,
      updatedAt: createdAt,
    });
  }
}
