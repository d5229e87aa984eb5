import type { ConsentContent } from '#shared/contracts/consents.js';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import type { Attach } from '../attachments/proofs.service.js';

/** What was said, with the clip that came with it as its proof. The clip is the giver's, and belongs to the consent. */
export async function withClip(
  manager: EntityManager,
  { communityId, person }: Actor,
  consentId: string,
  content: ConsentContent,
  attach: Attach | null,
): Promise<ConsentContent> {
  if (attach === null) return content;
  const attachmentId = await attach(manager, {
    communityId,
    subjectType: 'consent',
    subjectId: consentId,
    speaker: content.giverName.slice(0, 80),
    giverId: content.giverId ?? person.id,
    addedBy: person.id,
  });
  return { ...content, proof: { kind: 'voice', witness: '', attachmentId } };
}
