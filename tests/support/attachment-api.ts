import type { Attachment, AttachmentInput } from '#shared/contracts/attachments.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { randomUUID } from 'node:crypto';
import type { Client } from './api.js';
import { plainPicture, webm } from './media.js';

/** A picture of a figure; whole, ready to send. */
export function attachmentInput(changes: Partial<AttachmentInput> = {}): AttachmentInput {
  return {
    clientId: randomUUID(),
    kind: 'picture',
    subjectType: 'figure',
    subjectId: '',
    title: 'The bowl',
    speaker: '',
    language: null,
    consent: 'asked',
    sharingLevel: 'village',
    sharing: PLAIN_DETAILS,
    giverId: null,
    ...changes,
  };
}

/** A recording on the same; its level is the elders' unless another one is chosen. */
export function recordingInput(changes: Partial<AttachmentInput> = {}): AttachmentInput {
  return attachmentInput({
    kind: 'recording',
    title: 'Why the bowl is empty',
    speaker: 'A-2',
    language: 'art-x-tazimel',
    consent: 'clip',
    sharingLevel: 'elders',
    sharing: { ...PLAIN_DETAILS, trace: 'none' },
    ...changes,
  });
}

export const attachmentsPath = (client: Client): string =>
  `/api/communities/${client.communityId}/attachments`;

export async function addPicture(
  client: Client,
  subjectId: string,
  changes: Partial<AttachmentInput> = {},
  file?: Buffer,
): Promise<Attachment> {
  const input = attachmentInput({ subjectId, ...changes });
  const sent = client.upload(attachmentsPath(client), input, file ?? (await plainPicture()));
  return (await sent.expect(201)).body as Attachment;
}

/** A recording with its spoken consent and as many parts as there are texts. */
export async function addRecording(
  client: Client,
  subjectId: string,
  changes: Partial<AttachmentInput> = {},
  parts: readonly string[] = ['first'],
): Promise<Attachment> {
  const input = recordingInput({ subjectId, ...changes });
  const clip = webm({ note: 'I agree' });
  let attachment = (await client.upload(attachmentsPath(client), input, clip).expect(201)).body as Attachment;
  for (const [index, note] of parts.entries()) {
    attachment = await addPart(client, attachment.id, index + 1, note);
  }
  return attachment;
}

export async function addPart(client: Client, id: string, part: number, note: string): Promise<Attachment> {
  const sent = client.upload(`/api/attachments/${id}/parts`, { part, seconds: 2 }, webm({ note }));
  return (await sent.expect(201)).body as Attachment;
}
