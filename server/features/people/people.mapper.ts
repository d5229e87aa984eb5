import { fromYearStart } from '#shared/calendar/local-months.js';
import type { Community, CommunityInput, CommunityPerson } from '#shared/contracts/people.js';
import type { CommunityEntity } from '../../db/entities/community.entity.js';
import type { MembershipEntity } from '../../db/entities/membership.entity.js';
import type { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';

export function toCommunity(row: CommunityEntity): Community {
  return {
    id: row.id,
    name: row.name,
    villageLanguage: { tag: row.villageLanguageTag, name: row.villageLanguageName },
    officerLanguage: { tag: row.officerLanguageTag, name: row.officerLanguageName },
    yearStart: { date: { month: row.yearStartMonth, day: row.yearStartDay }, note: row.yearStartNote },
    localMonths: row.localMonths,
    moonNames: row.moonNames,
    weatherContact: row.weatherContact,
    agricultureContact: row.agricultureContact,
    signOffRule: row.signOffRule,
    version: row.version,
  };
}

export function fromCommunityInput(
  input: CommunityInput,
): Omit<CommunityEntity, 'id' | 'createdAt' | 'version'> {
  return {
    name: input.name,
    villageLanguageTag: input.villageLanguage.tag,
    villageLanguageName: input.villageLanguage.name,
    officerLanguageTag: input.officerLanguage.tag,
    officerLanguageName: input.officerLanguage.name,
    yearStartMonth: input.yearStart.date.month,
    yearStartDay: input.yearStart.date.day,
    yearStartNote: input.yearStart.note,
    localMonths: fromYearStart(input.localMonths, input.yearStart.date),
    moonNames: input.moonNames,
    weatherContact: input.weatherContact,
    agricultureContact: input.agricultureContact,
    signOffRule: input.signOffRule,
  };
}

/** `code` is the open code of a person who has not set a password yet. */
export function toCommunityPerson(
  membership: MembershipEntity,
  code: OneTimeCodeEntity | null,
  showsEmail: boolean,
): CommunityPerson {
  const { person } = membership;
  const active = person.passwordHash !== null || person.email === null;
  return {
    id: person.id,
    email: showsEmail ? (person.email ?? '') : '',
    displayName: person.displayName,
    roles: membership.roles,
    active,
    codeExpiresAt: active || !showsEmail ? null : (code?.expiresAt.toISOString() ?? null),
    version: membership.version,
  };
}
