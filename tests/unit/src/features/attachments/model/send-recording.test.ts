import 'fake-indexeddb/auto';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Attachment } from '#shared/contracts/attachments.js';
import { keepRecording, keepSlice, keptParts } from '#src/features/attachments/model/kept-recordings.js';
import { sendRecording, type RecordingUploads } from '#src/features/attachments/model/send-recording.js';
import { textOf } from '#tests/support/blob-text.js';
import { keptRecording } from '#tests/support/kept-recording.js';

const begin = vi.fn();
const addPart = vi.fn();
const uploads: RecordingUploads = { begin, addPart };

/** What the server has; it answers with the parts that came. */
let came: number[];
const answer = () =>
  ({ id: 'the-recording', parts: came.map((part) => ({ part })) }) as unknown as Attachment;
let sent: string[];
const watch = () => ({ onProgress: vi.fn(), signal: new AbortController().signal });

beforeEach(() => {
  came = [];
  sent = [];
  begin.mockReset().mockImplementation(async (_community: string, _input: unknown, file: Blob) => {
    sent.push(`consent ${await textOf(file)}`);
    came = [...new Set([0, ...came])];
    return answer();
  });
  addPart.mockReset().mockImplementation(async (_id: string, { part }: { part: number }, file: Blob) => {
    sent.push(`${part} ${await textOf(file)}`);
    came.push(part);
    return answer();
  });
});

async function kept() {
  const recording = keptRecording();
  await keepRecording(recording);
  for (const [part, text] of ['I agree', 'one', 'two'].entries()) {
    await keepSlice(recording.clientId, { part, index: 0, content: new Blob([text]), seconds: 2 });
  }
  return recording;
}

describe('sending a recording', () => {
  it('sends the agreement first, then part after part, and then it is not on this device any more', async () => {
    const recording = await kept();
    await sendRecording(recording, watch(), uploads);
    expect(sent).toEqual(['consent I agree', '1 one', '2 two']);
    expect(begin.mock.calls[0]?.[1]).toMatchObject({
      clientId: recording.clientId,
      consent: 'clip',
      kind: 'recording',
    });
    expect(await keptParts(recording)).toEqual([]);
  });

  it('that was cut is kept, and goes on with what is missing', async () => {
    const recording = await kept();
    addPart.mockImplementationOnce(async (_id: string, { part }: { part: number }) => {
      came.push(part);
      return Promise.resolve(answer());
    });
    addPart.mockRejectedValueOnce(new Error('the line is dead'));
    await expect(sendRecording(recording, watch(), uploads)).rejects.toThrow('the line is dead');
    expect(await keptParts(recording)).toHaveLength(3);
    sent = [];
    await sendRecording(recording, watch(), uploads);
    expect(sent).toEqual(['consent I agree', '2 two']);
    expect(await keptParts(recording)).toEqual([]);
  });

  it('without the spoken agreement does not begin', async () => {
    const recording = keptRecording();
    await keepSlice(recording.clientId, { part: 1, index: 0, content: new Blob(['one']), seconds: 2 });
    await expect(sendRecording(recording, watch(), uploads)).rejects.toThrow('spoken consent');
    expect(begin).not.toHaveBeenCalled();
  });

  it('tells how far it is over all parts together', async () => {
    const recording = await kept();
    begin.mockImplementationOnce(
      (_community: string, _input: unknown, _file: Blob, { onProgress }: ReturnType<typeof watch>) => {
        // The form around the file counts as well: only the share matters.
        onProgress(50, 100);
        came = [0];
        return Promise.resolve(answer());
      },
    );
    const { onProgress, signal } = watch();
    await sendRecording(recording, { onProgress, signal }, uploads);
    const total = 'I agree'.length + 'one'.length + 'two'.length;
    expect(onProgress).toHaveBeenCalledWith('I agree'.length / 2, total);
  });
});
