import type { ConsentContent, ConsentLine } from '#shared/contracts/consents.js';
import type { EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { ConsentEntity } from '../../db/entities/consent.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import { hasRole, type Actor } from '../../http/actor.js';
import type { Member, Viewer } from '../../policy/viewer.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import { isOpen } from '../../policy/consents.js';
import type { ConsentThing } from './consent-things.service.js';

/** The giver, whoever gave the thing itself, and those who compile, review and sign, of what they see. */
export function mayOf(
  viewer: Viewer,
  row: Pick<ConsentEntity, 'giverId' | 'state' | 'details'>,
  thing: ConsentThing,
): ConsentLine['may'] {
  const isGiver = row.giverId === viewer.personId || thing.giverId === viewer.personId;
  const read = isGiver || (thing.isSeen && keeps(viewer));
  const isYes = row.state === 'given' || row.state === 'given-with-conditions';
  // Taking back is as easy as giving: the steward does it without reading what it is about.
  return {
    read,
    change: read,
    withdraw: isYes && (read || hasRole(viewer, 'steward') || isNamed(viewer, row, thing)),
  };
}

/** Whom the giver named beside themself: elders, or the people of a family or group, without reading what it is about. */
function isNamed(
  { roles, groupIds }: Viewer,
  { details: { mayWithdraw, withdrawGroupId = null } }: Pick<ConsentEntity, 'details'>,
  { shared }: ConsentThing,
): boolean {
  if (mayWithdraw.includes('elders') && roles.includes('elder')) return true;
  // A group that keeps the thing is meant where no other is named.
  const groupId = withdrawGroupId ?? (mayWithdraw.includes('group') ? shared.details.groupId : null);
  const byGroup = mayWithdraw.includes('family') || mayWithdraw.includes('group');
  return byGroup && groupId !== null && groupIds.has(groupId);
}

export function mayAsk(actor: Member, thing: ConsentThing): boolean {
  return thing.giverId === actor.person.id || (thing.isSeen && keeps(actor));
}

function keeps(actor: Pick<Member, 'roles'>): boolean {
  return hasRole(actor, 'officer', 'steward', 'elder');
}

/** What was answered once is not asked as if for the first time: until a new yes it stays as it is. */
export function expectAnswerFollows(before: ConsentEntity['state'], { answer }: ConsentContent): void {
  if (isOpen(answer) && !isOpen(before)) throw invalidField('content.answer', 'answered-before');
}

/**
 * A yes has its proof; the givers' own is that they said it themselves, signed in. Nobody says "own word" for somebody
 * else, nor about what somebody else gave unless they were asked about it. A no needs none.
 */
export function withProof(
  actor: Actor,
  content: ConsentContent,
  asked: { giverId: string | null },
  prefix: string,
): ConsentContent {
  const { proof, giverId } = content;
  const isOwn = giverId === actor.person.id && asked.giverId === actor.person.id;
  if (proof?.kind === 'own-word' && !isOwn) throw invalidField(`${prefix}proof.kind`, 'own-word-of-giver');
  if (isOwn && proof === null) {
    return { ...content, proof: { kind: 'own-word', witness: '', attachmentId: null } };
  }
  if (content.uses.length > 0 && proof === null) throw invalidField(`${prefix}proof`, 'proof-required');
  return content;
}

/** Whoever writes a yes down for the person they help brings that person's own: their PIN, or their voice. */
export function expectElderProof({ helper }: Actor, { uses, proof }: ConsentContent): void {
  if (helper === undefined || uses.length === 0 || helper.provedNow || proof?.kind === 'voice') return;
  throw new AppError('not-allowed', { reason: 'proof-needed' });
}

/** Givers are of this village; a voice or a picture that proves a consent belongs to that consent. */
export async function expectKnown(
  manager: EntityManager,
  { communityId }: Actor,
  { giverId, proof, withdrawGroupId }: ConsentContent,
  consentId: string,
  prefix: string,
): Promise<void> {
  if (giverId !== null && !(await manager.existsBy(MembershipEntity, { communityId, personId: giverId }))) {
    throw invalidField(`${prefix}giverId`, 'not-of-this-village');
  }
  const groupId = withdrawGroupId ?? null;
  if (groupId !== null && !(await manager.existsBy(VillageGroupEntity, { id: groupId, communityId }))) {
    throw invalidField(`${prefix}withdrawGroupId`, 'unknown');
  }
  const attachmentId = proof?.attachmentId ?? null;
  if (attachmentId === null) return;
  const belongs = { id: attachmentId, communityId, subjectType: 'consent' as const, subjectId: consentId };
  if (!(await manager.existsBy(AttachmentEntity, belongs))) {
    throw invalidField(`${prefix}proof.attachmentId`, 'unknown');
  }
}

/** Who changes a consent of somebody else does it for them; staff and observers only for themselves. */
export function expectMayAsk(actor: Actor, thing: ConsentThing): void {
  if (!mayAsk(actor, thing)) throw conflict('not-the-giver');
}
