import type { Attachment, AttachmentInput } from '#shared/contracts/attachments.js';
import { addRecordingPart, beginAttachment } from '../api/attachment-uploads.js';
import { dropRecording, keptParts, type KeptRecording } from './kept-recordings.js';

/** What carries a recording to the server. */
export interface RecordingUploads {
  begin: typeof beginAttachment;
  addPart: typeof addRecordingPart;
}

interface Sending {
  onProgress: (sentBytes: number, ofBytes: number) => void;
  signal: AbortSignal;
}

/**
 * Sends a kept recording: the spoken consent first, then part after part. Called again after a broken line it goes on
 * with what is missing. Only when everything has come is it taken off this device.
 */
export async function sendRecording(
  kept: KeptRecording,
  { onProgress, signal }: Sending,
  uploads: RecordingUploads = { begin: beginAttachment, addPart: addRecordingPart },
): Promise<Attachment> {
  const parts = await keptParts(kept);
  const total = parts.reduce((sum, { content }) => sum + content.size, 0);
  let before = 0;
  const tell = (content: Blob) => (sent: number, of: number) => {
    onProgress(before + (of === 0 ? 0 : (sent / of) * content.size), total);
  };
  const [consent, ...spoken] = parts;
  if (consent?.part !== 0) throw new Error('A recording without its spoken consent');
  let attachment = await uploads.begin(kept.communityId, inputOf(kept), consent.content, {
    onProgress: tell(consent.content),
    signal,
  });
  before += consent.content.size;
  for (const [index, { content, seconds }] of spoken.entries()) {
    const part = index + 1;
    if (!attachment.parts.some((each) => each.part === part)) {
      attachment = await uploads.addPart(attachment.id, { part, seconds }, content, {
        onProgress: tell(content),
        signal,
      });
    }
    before += content.size;
  }
  await dropRecording(kept.clientId);
  return attachment;
}

function inputOf(kept: KeptRecording): AttachmentInput {
  const { clientId, subjectType, subjectId, title, speaker, language } = kept;
  const { sharingLevel, sharing, giverId } = kept;
  return {
    clientId,
    kind: 'recording',
    subjectType,
    subjectId,
    title,
    speaker,
    language,
    consent: 'clip',
    sharingLevel,
    sharing,
    giverId,
  };
}
