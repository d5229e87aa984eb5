import { AnswerEntity } from './answer.entity.js';
import { AttachmentEntity } from './attachment.entity.js';
import { AttachmentPartEntity } from './attachment-part.entity.js';
import { AttachmentWordsEntity } from './attachment-words.entity.js';
import { AuditEventEntity } from './audit-event.entity.js';
import { CalendarFeedEntity } from './calendar-feed.entity.js';
import { CalendarVersionEntity } from './calendar-version.entity.js';
import { CalendarEntity } from './calendar.entity.js';
import { CommunityEntity } from './community.entity.js';
import { ConsentEntity } from './consent.entity.js';
import { DeathEntity } from './death.entity.js';
import { DraftContributionEntity } from './draft-contribution.entity.js';
import { EntryEntity } from './entry.entity.js';
import { FigureEntity } from './figure.entity.js';
import { GroupMemberEntity } from './group-member.entity.js';
import { ItemSharingEntity } from './item-sharing.entity.js';
import { KeptReadEntity } from './kept-read.entity.js';
import { LetterChoiceEntity } from './letter-choice.entity.js';
import { MeetingEntity } from './meeting.entity.js';
import { LetterEntity } from './letter.entity.js';
import { MembershipEntity } from './membership.entity.js';
import { OneTimeCodeEntity } from './one-time-code.entity.js';
import { PersonEntity } from './person.entity.js';
import { PlaceEntity } from './place.entity.js';
import { SessionEntity } from './session.entity.js';
import { SignInCardEntity } from './sign-in-card.entity.js';
import { SignatureEntity } from './signature.entity.js';
import { NoNameEntity } from './no-name.entity.js';
import { OpenPageEntity } from './open-page.entity.js';
import { RolledItemEntity } from './rolled-item.entity.js';
import { RolloverEntity } from './rollover.entity.js';
import { VersionEntryEntity } from './version-entry.entity.js';
import { NoteAnswerEntity } from './note-answer.entity.js';
import { NoteEntity } from './note.entity.js';
import { EntryVariantEntity } from './entry-variant.entity.js';
import { VersionVariantEntity } from './version-variant.entity.js';
import { WithdrawalEntity } from './withdrawal.entity.js';
import { SignEntity } from './sign.entity.js';
import { OwnSightingEntity } from './own-sighting.entity.js';
import { SignSightingEntity } from './sign-sighting.entity.js';
import { SeasonDecisionEntity } from './season-decision.entity.js';
import { SeasonLessonEntity } from './season-lesson.entity.js';
import { RainDayEntity } from './rain-day.entity.js';
import { WeatherNoticeEntity } from './weather-notice.entity.js';
import { ActualDateEntity } from './actual-date.entity.js';
import { VillageGroupEntity } from './village-group.entity.js';
import { WordListEntity } from './word-list.entity.js';
import { WriteKeyEntity } from './write-key.entity.js';

/** Named one by one: a glob would miss a file quietly, and breaks in a build. */
export const ENTITIES = [
  PersonEntity,
  SessionEntity,
  OneTimeCodeEntity,
  SignInCardEntity,
  CommunityEntity,
  MembershipEntity,
  PlaceEntity,
  FigureEntity,
  SignEntity,
  SignSightingEntity,
  OwnSightingEntity,
  WeatherNoticeEntity,
  RainDayEntity,
  WordListEntity,
  CalendarEntity,
  EntryEntity,
  DeathEntity,
  DraftContributionEntity,
  CalendarFeedEntity,
  CalendarVersionEntity,
  VersionEntryEntity,
  AnswerEntity,
  MeetingEntity,
  SignatureEntity,
  AuditEventEntity,
  LetterEntity,
  LetterChoiceEntity,
  AttachmentEntity,
  AttachmentPartEntity,
  AttachmentWordsEntity,
  VillageGroupEntity,
  GroupMemberEntity,
  ItemSharingEntity,
  KeptReadEntity,
  WithdrawalEntity,
  NoteEntity,
  NoteAnswerEntity,
  EntryVariantEntity,
  VersionVariantEntity,
  ActualDateEntity,
  ConsentEntity,
  RolloverEntity,
  RolledItemEntity,
  NoNameEntity,
  OpenPageEntity,
  WriteKeyEntity,
  SeasonLessonEntity,
  SeasonDecisionEntity,
];
