import {
  attachmentsEndpoints,
  type Attachment,
  type AttachmentInput,
  type PartInput,
} from '#shared/contracts/attachments.js';
import { uploadToApi } from '#src/lib/api-upload.js';

interface Watch {
  onProgress: (sentBytes: number, ofBytes: number) => void;
  signal: AbortSignal;
}

/** A picture, or the first file of a recording: its spoken consent. */
export function beginAttachment(
  communityId: string,
  body: AttachmentInput,
  file: Blob,
  watch: Watch,
): Promise<Attachment> {
  return uploadToApi(attachmentsEndpoints.create, { params: { communityId }, body, file, ...watch });
}

export function addRecordingPart(
  attachmentId: string,
  body: PartInput,
  file: Blob,
  watch: Watch,
): Promise<Attachment> {
  return uploadToApi(attachmentsEndpoints.addPart, { params: { attachmentId }, body, file, ...watch });
}
