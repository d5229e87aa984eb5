import 'fake-indexeddb/auto';
import { describe, expect, it } from 'vitest';
import {
  dropPart,
  dropRecording,
  dropRecordingsOf,
  keepRecording,
  keepSlice,
  keptParts,
  keptRecordings,
} from '#src/features/attachments/model/kept-recordings.js';
import { textOf } from '#tests/support/blob-text.js';
import { keptRecording } from '#tests/support/kept-recording.js';

const slice = (part: number, index: number, text: string, seconds = index * 2 + 2) => ({
  part,
  index,
  content: new Blob([text]),
  seconds,
});

describe('a recording on this device', () => {
  it('comes back in its parts and slices, however it was interrupted', async () => {
    const recording = keptRecording();
    await keepRecording(recording);
    // Slices of two parts overlap at the seam: the next part has begun when the last slice comes.
    await keepSlice(recording.clientId, slice(0, 0, 'I agree'));
    await keepSlice(recording.clientId, slice(1, 0, 'once '));
    await keepSlice(recording.clientId, slice(2, 0, 'and again'));
    await keepSlice(recording.clientId, slice(1, 1, 'upon'));
    const parts = await keptParts(recording);
    expect(
      await Promise.all(
        parts.map(async ({ part, content, seconds }) => [part, await textOf(content), seconds]),
      ),
    ).toEqual([
      [0, 'I agree', 2],
      [1, 'once upon', 4],
      [2, 'and again', 2],
    ]);
    expect(parts[1]?.content.type).toBe('audio/webm');
  });

  it('keeps more than ten slices in their order', async () => {
    const recording = keptRecording();
    for (let index = 0; index < 12; index += 1) {
      await keepSlice(recording.clientId, slice(1, index, `${index} `));
    }
    const [part] = await keptParts(recording);
    expect(await textOf(part?.content)).toBe('0 1 2 3 4 5 6 7 8 9 10 11 ');
  });

  it('is found by the person who made it, at the thing it belongs to, oldest first', async () => {
    const subject = { subjectType: 'entry', subjectId: 'here' } as const;
    await keepRecording(
      keptRecording({ ...subject, personId: 'a', speaker: 'later', beganAt: '2027-03-02' }),
    );
    await keepRecording(
      keptRecording({ ...subject, personId: 'a', speaker: 'first', beganAt: '2027-03-01' }),
    );
    await keepRecording(keptRecording({ ...subject, personId: 'b', speaker: 'somebody else' }));
    await keepRecording(
      keptRecording({ ...subject, subjectId: 'there', personId: 'a', speaker: 'elsewhere' }),
    );
    const found = await keptRecordings('a', subject);
    expect(found.map(({ speaker }) => speaker)).toEqual(['first', 'later']);
  });

  it('forgets one part, or everything, and nothing of another', async () => {
    const [one, other] = [keptRecording({ personId: 'c' }), keptRecording({ personId: 'c' })];
    for (const { clientId } of [one, other]) {
      await keepSlice(clientId, slice(0, 0, 'I agree'));
      await keepSlice(clientId, slice(1, 0, 'a voice'));
    }
    await keepRecording(one);
    await keepRecording(other);
    await dropPart(one.clientId, 0);
    expect((await keptParts(one)).map(({ part }) => part)).toEqual([1]);
    await dropRecording(one.clientId);
    expect(await keptParts(one)).toEqual([]);
    expect((await keptRecordings('c', one)).map(({ clientId }) => clientId)).toEqual([other.clientId]);
    expect(await keptParts(other)).toHaveLength(2);
  });

  it('forgets what belongs to things that were taken back, whoever recorded it here', async () => {
    const [one, other, elsewhere] = [
      keptRecording({ personId: 'd', subjectId: 'gone' }),
      keptRecording({ personId: 'e', subjectId: 'gone' }),
      keptRecording({ personId: 'd', subjectId: 'stays' }),
    ];
    for (const recording of [one, other, elsewhere]) {
      await keepRecording(recording);
      await keepSlice(recording.clientId, slice(1, 0, 'a voice'));
    }
    await dropRecordingsOf(new Set(['gone']));
    expect([await keptRecordings('d', one), await keptRecordings('e', other)]).toEqual([[], []]);
    expect([await keptParts(one), await keptParts(other)]).toEqual([[], []]);
    expect(await keptParts(elsewhere)).toHaveLength(1);
  });
});
