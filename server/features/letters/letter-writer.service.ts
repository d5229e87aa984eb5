import { addHours } from 'date-fns';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import type { DataSource } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import type { LetterEntity } from '../../db/entities/letter.entity.js';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import type { Clock } from '../../http/context.js';
import type { OutgoingLetter } from '../../mail/mailer.js';
import { translatorFor } from '../../print/translator.js';
import { codeHash } from '../session/one-time-codes.service.js';
import { letterChoicesOf } from './letter-choices.service.js';
import { invitationCode, resetToken } from './letter-secrets.js';
import { letterWords } from './letter-words.js';
import { USUAL_CHOICE } from './letters.mapper.js';
import { afterQuietHours } from './quiet-hours.js';
import { stillWaiting, topicOf, villageTimeZone, type StillWaiting } from './still-waiting.service.js';

export const RESET_HOURS = 2;

/** Why a letter is not needed any more. */
export type DropReason = 'no-account' | 'code-void' | 'nothing-waits' | 'no-letters-wanted' | 'no-address';

export interface LetterSettings {
  publicUrl: string;
  serverSecret: string;
  from: string;
}

/** Where a submission waits for the person. */
const PAGES = {
  answer: '/review',
  'answer-own': '/own',
  'sign-as-elder': '',
  'sign-as-steward': '',
} as const satisfies Record<StillWaiting['does'], string>;

type Addressed = Pick<PersonEntity, 'id' | 'displayName'> & { email: string };
type Written = { letter: OutgoingLetter } | { dropped: DropReason } | { notBefore: Date };

/** Writes a letter of the outbox at the moment when it goes, and looks whether it is still needed. */
export class LetterWriterService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly settings: LetterSettings,
  ) {}

  async write(row: LetterEntity): Promise<Written> {
    const person = await this.personOf(row);
    if (person === null) return { dropped: 'no-account' };
    if (person.email === null) return { dropped: 'no-address' };
    const { id, displayName, email } = person;
    const to = { id, displayName, email };
    if (row.kind === 'invitation') return this.invitation(row, to);
    if (row.kind === 'password-reset') return this.passwordReset(row, to);
    return this.whatWaits(row, to);
  }

  private async personOf({ personId, email }: LetterEntity): Promise<PersonEntity | null> {
    const where = personId === null ? { email: email ?? '' } : { id: personId };
    return this.dataSource.getRepository(PersonEntity).findOne({ where });
  }

  private async invitation(row: LetterEntity, person: Addressed): Promise<Written> {
    const code = await this.codeOf(row);
    if (code === null) return { dropped: 'code-void' };
    const words = invitationCode(this.settings.serverSecret, row.id);
    return this.finish(row, person, `/welcome#code=${encodeURIComponent(words)}`, 1);
  }

  /** The row of the code is made now, so that asking costs the same for every address. */
  private async passwordReset(row: LetterEntity, person: Addressed): Promise<Written> {
    const token = resetToken(this.settings.serverSecret, row.id);
    await this.dataSource
      .createQueryBuilder()
      .insert()
      .into(OneTimeCodeEntity)
      .values({
        id: row.id,
        purpose: 'reset',
        personId: person.id,
        codeHash: codeHash(token),
        failedTries: 0,
        expiresAt: addHours(row.createdAt, RESET_HOURS),
        usedAt: null,
      })
      .orIgnore()
      .updateEntity(false)
      .execute();
    if ((await this.codeOf(row)) === null) return { dropped: 'code-void' };
    return this.finish(row, person, `/reset#token=${token}`, 1);
  }

  private async whatWaits(row: LetterEntity, person: Addressed): Promise<Written> {
    const { manager } = this.dataSource;
    const communityId = row.communityId ?? '';
    const choice = (await letterChoicesOf(manager, [person.id])).get(person.id) ?? USUAL_CHOICE;
    if (choice.channel === 'none') return { dropped: 'no-letters-wanted' };
    // Asked again here: a letter that was held up must not go at night.
    const now = this.clock.now();
    const notBefore = afterQuietHours(now, await villageTimeZone(manager, communityId), choice.quietHours);
    if (notBefore > now) return { notBefore };
    const waiting = (await stillWaiting(manager, now, { communityId, personId: person.id })).filter(
      (one) => row.kind === 'digest' || row.onceKey.startsWith(`${topicOf(one)}:`),
    );
    const first = waiting[0];
    if (first === undefined) return { dropped: 'nothing-waits' };
    const version = `/calendars/${first.version.calendarId}/versions/${first.version.number}`;
    const link = `${version}${PAGES[first.does]}`;
    return this.finish(row, person, row.kind === 'digest' ? '/' : link, waiting.length);
  }

  private async codeOf(row: LetterEntity): Promise<OneTimeCodeEntity | null> {
    const code = await this.dataSource.getRepository(OneTimeCodeEntity).findOneBy({ id: row.id });
    return code !== null && code.usedAt === null && code.expiresAt > this.clock.now() ? code : null;
  }

  private async finish(row: LetterEntity, person: Addressed, path: string, count: number): Promise<Written> {
    const { publicUrl, from } = this.settings;
    const community = await this.communityOf(row, person);
    const words = letterWords(translatorFor(community?.officerLanguageTag ?? 'en', 'letters'), {
      kind: row.kind,
      name: person.displayName,
      village: community?.name ?? '',
      count,
      link: `${publicUrl}${path}`,
      choiceLink: `${publicUrl}/account`,
    });
    return {
      letter: {
        messageId: `<${row.id}@${from.split('@')[1] ?? 'dawnpeg'}>`,
        to: { name: person.displayName, address: person.email },
        ...words,
      },
    };
  }

  /** The village that the letter is about, or the person's first one: letters are in its second language. */
  private async communityOf(row: LetterEntity, { id: personId }: Addressed): Promise<CommunityEntity | null> {
    const { manager } = this.dataSource;
    if (row.communityId !== null) return manager.findOneBy(CommunityEntity, { id: row.communityId });
    const membership = await manager.findOne(MembershipEntity, {
      where: { personId },
      relations: { community: true },
      order: { community: { name: 'ASC' } },
    });
    return membership?.community ?? null;
  }
}
