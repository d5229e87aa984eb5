import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { instantColumn } from './columns.js';

/** What a session keeps of the sign-in, within `data`. */
export interface SessionDevice {
  beganAt: string;
  browser: string | null;
  system: string | null;
}

/** The card that opened a session, and the one village that it opens; within `data`, too. */
export interface SessionCard {
  id: string;
  communityId: string;
}

/** Whom this session helps, until when; within `data`, too. */
export interface SessionHelping {
  communityId: string;
  personId: string;
  /** The card whose PIN was shown; null where none was. */
  cardId: string | null;
  until: string;
}

/** A browser's session. The id is kept as a hash: a stolen table opens no session. */
@Entity({ name: 'session' })
export class SessionEntity {
  @PrimaryColumn({ name: 'sid_hash', type: 'varchar', length: 64, charset: 'ascii', collation: 'ascii_bin' })
  sidHash!: string;

  @Index('session_person')
  @Column({ name: 'person_id', type: 'uuid', nullable: true })
  personId!: string | null;

  /** The card that opened it, if it was one. */
  @Index('session_card')
  @Column({ name: 'card_id', type: 'uuid', nullable: true })
  cardId!: string | null;

  @Column({ type: 'longtext' })
  data!: string;

  @Index('session_expiry')
  @Column({ name: 'expires_at', ...instantColumn })
  expiresAt!: Date;
}
