import { useCallback, useState } from 'react';
import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import {
  dropPart,
  dropRecording,
  keepRecording,
  keptParts,
  type KeptPart,
  type KeptRecording,
  type SharingOfAttachment,
} from './kept-recordings.js';
import { newId } from '#src/lib/new-id.js';
import { useMicrophone, type Microphone } from './use-microphone.js';
import { recordingType } from './voice-chain.js';

/** Where one is: who speaks, the spoken agreement, the recording, listening to it. */
export type RecorderStep = 'about' | 'consent' | 'voice' | 'listen';

export interface About extends SharingOfAttachment {
  speaker: string;
  language: string;
}

export interface Recorder {
  step: RecorderStep;
  recording: KeptRecording | null;
  parts: readonly KeptPart[];
  microphone: Microphone;
  tellAbout: (about: About) => Promise<void>;
  /** Of the present step: the agreement, or the next part. */
  record: () => Promise<void>;
  stop: () => Promise<void>;
  againConsent: () => Promise<void>;
  goTo: (step: RecorderStep) => void;
  setTitle: (title: string) => Promise<void>;
  throwAway: () => Promise<void>;
}

interface RecorderOptions extends AttachmentSubject {
  personId: string;
  communityId: string;
  /** One that was found on this device; null to begin anew. */
  found: { recording: KeptRecording; parts: readonly KeptPart[] } | null;
}

/** One recording from its first word to the moment before it is sent. Everything is kept on this device as it comes. */
export function useRecorder({
  found,
  personId,
  communityId,
  subjectType,
  subjectId,
}: RecorderOptions): Recorder {
  const [step, setStep] = useState<RecorderStep>(firstStep(found?.parts ?? null));
  const [recording, setRecording] = useState<KeptRecording | null>(found?.recording ?? null);
  const [parts, setParts] = useState<readonly KeptPart[]>(found?.parts ?? []);

  const readParts = useCallback(async () => {
    if (recording !== null) setParts(await keptParts(recording));
  }, [recording]);
  const afterStop = useCallback(async () => {
    await readParts();
    setStep((before) => (before === 'voice' ? 'listen' : before));
  }, [readParts]);
  const microphone = useMicrophone(afterStop);

  const tellAbout = async (about: About) => {
    const next: KeptRecording = {
      clientId: recording?.clientId ?? newId(),
      personId,
      communityId,
      subjectType,
      subjectId,
      title: recording?.title ?? '',
      mimeType: recording?.mimeType ?? recordingType() ?? '',
      beganAt: recording?.beganAt ?? new Date().toISOString(),
      ...about,
    };
    await keepRecording(next);
    setRecording(next);
    setStep('consent');
  };
  const record = async () => {
    if (recording === null) return;
    const nextPart = step === 'consent' ? 0 : Math.max(0, ...parts.map(({ part }) => part)) + 1;
    setStep((before) => (before === 'listen' ? 'voice' : before));
    await microphone.start(recording, nextPart);
  };
  const againConsent = async () => {
    if (recording === null) return;
    await dropPart(recording.clientId, 0);
    setParts([]);
    await microphone.start(recording, 0);
  };
  const setTitle = async (title: string) => {
    if (recording === null) return;
    const next = { ...recording, title };
    setRecording(next);
    await keepRecording(next);
  };
  const throwAway = async () => {
    await microphone.stop();
    if (recording !== null) await dropRecording(recording.clientId);
  };
  return {
    step,
    recording,
    parts,
    microphone,
    tellAbout,
    record,
    stop: microphone.stop,
    againConsent,
    goTo: setStep,
    setTitle,
    throwAway,
  };
}

/** One that was found goes on where it was left: to be listened to, or at the recording after the agreement. */
function firstStep(parts: readonly KeptPart[] | null): RecorderStep {
  if (parts === null) return 'about';
  return parts.some(({ part }) => part > 0) ? 'listen' : 'consent';
}
