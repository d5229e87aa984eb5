import type { TFunction } from 'i18next';
import type { AuditEvent } from '#shared/contracts/audit.js';
import { ROLES, type Role } from '#shared/contracts/people.js';
import { SHARING_LEVELS, type SharingLevel } from '#shared/contracts/sharing.js';
import { texts } from '#shared/locales/en/audit.js';
import { listWords } from '#src/lib/list-words.js';

type Words = TFunction<['audit', 'common', 'sharing']>;
type Field = keyof typeof texts.field;

/** One row of the records as a sentence. Unknown codes of a newer release become general words, never nothing. */
export function auditSentence(t: Words, language: string, event: AuditEvent): string {
  const { details } = event;
  const list = (values: readonly string[]) => listWords(values, language);
  const roles = (value: unknown) => list(asRoles(value).map((role) => t(`common:role.${role}`)));
  const sentence = t(`audit:sentence.${event.action}`, {
    actor: event.actorName === '' ? t('audit:somebody') : event.actorName,
    subject: event.subjectName ?? t(event.isKept ? 'audit:kept' : 'audit:gone'),
    level: isLevel(details['to']) ? t(`sharing:level.${details['to']}.name`) : '',
    roles: roles(details['roles']),
    before: roles(details['before']),
    after: roles(details['after']),
    role: roles([details['role']]),
    fields: list(asTexts(details['fields']).map((field) => t(`audit:field.${asField(field)}`))),
    number: asText(details['number']),
    what: t(`audit:attachment.${details['kind'] === 'picture' ? 'picture' : 'recording'}`),
    label: asText(details['label']),
    by: asText(details['by']),
    reason:
      details['reason'] === 'elder-asked' ? t('audit:reason.elder-asked') : t('audit:reason.taken-back'),
    state: isConsentState(details['state']) ? t(`audit:consent.${details['state']}`) : '',
    list: isWordList(details['list']) ? t(`audit:wordList.${details['list']}`) : '',
    way: isWay(details['way']) ? t(`audit:way.${details['way']}`) : '',
    why: isCardEnd(details['why']) ? t(`audit:cardEnd.${details['why']}`) : '',
    answer: isAnswer(details['answer']) ? t(`audit:answer.${details['answer']}`) : '',
  });
  const name = event.onBehalfOfName;
  return name === undefined ? sentence : t('audit:onBehalf', { sentence, name: name || t('audit:somebody') });
}

function asText(value: unknown): string {
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}

function asTexts(value: unknown): string[] {
  return Array.isArray(value) ? value.map(asText) : [];
}

function asRoles(value: unknown): Role[] {
  return ROLES.filter((role) => asTexts(value).includes(role));
}

function asField(field: string): Field {
  return field in texts.field ? (field as Field) : 'other';
}

function isLevel(value: unknown): value is SharingLevel {
  return SHARING_LEVELS.some((level) => level === value);
}

function isConsentState(value: unknown): value is keyof typeof texts.consent {
  return typeof value === 'string' && value in texts.consent;
}

function isCardEnd(value: unknown): value is keyof typeof texts.cardEnd {
  return typeof value === 'string' && value in texts.cardEnd;
}

function isWordList(value: unknown): value is keyof typeof texts.wordList {
  return typeof value === 'string' && value in texts.wordList;
}

function isWay(value: unknown): value is keyof typeof texts.way {
  return typeof value === 'string' && value in texts.way;
}

function isAnswer(value: unknown): value is keyof typeof texts.answer {
  return typeof value === 'string' && value in texts.answer;
}
