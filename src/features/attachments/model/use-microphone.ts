import { useCallback, useEffect, useRef, useState } from 'react';
import { keepSlice, type KeptRecording } from './kept-recordings.js';
import { recordingType, VoiceChain } from './voice-chain.js';

export type MicrophoneTrouble = 'cannot' | 'insecure' | 'denied' | 'noMicrophone' | 'full';

export interface Microphone {
  isOn: boolean;
  /** The present sound, for a picture of it; null while nothing is recorded. */
  stream: MediaStream | null;
  /** The part that is being recorded. */
  part: number;
  trouble: MicrophoneTrouble | null;
  start: (recording: KeptRecording, firstPart: number) => Promise<void>;
  stop: () => Promise<void>;
}

/**
 * Records into what is kept on this device; slice by slice, so that closing the page loses two seconds at most.
 * `onStopped` is called when everything that was said is kept: after `stop`, or when the recording ends by itself.
 */
export function useMicrophone(onStopped: () => Promise<void>): Microphone {
  const [stream, setStream] = useState<MediaStream | null>(null);
  const [part, setPart] = useState(0);
  const [trouble, setTrouble] = useState<MicrophoneTrouble | null>(null);
  const chain = useRef<{ voice: VoiceChain; stream: MediaStream } | null>(null);
  const afterwards = useRef(onStopped);
  useEffect(() => {
    afterwards.current = onStopped;
  }, [onStopped]);

  const stop = useCallback(async () => {
    const running = chain.current;
    if (running === null) return;
    chain.current = null;
    await running.voice.stop();
    for (const track of running.stream.getTracks()) track.stop();
    setStream(null);
    await afterwards.current();
  }, []);

  const start = useCallback(
    async (recording: KeptRecording, firstPart: number) => {
      setTrouble(null);
      const found = await openMicrophone();
      if (typeof found === 'string') {
        setTrouble(found);
        return;
      }
      const voice = new VoiceChain({
        stream: found,
        mimeType: recording.mimeType,
        firstPart,
        onSlice: async (slice) => {
          setPart(slice.part);
          await keepSlice(recording.clientId, slice).catch(() => {
            setTrouble('full');
          });
        },
        onEnd: () => {
          void stop();
        },
      });
      chain.current = { voice, stream: found };
      setPart(firstPart);
      voice.start();
      setStream(found);
    },
    [stop],
  );

  // Leaving the screen ends the recording; what was said is kept.
  useEffect(
    () => () => {
      void stop();
    },
    [stop],
  );
  return { isOn: stream !== null, stream, part, trouble, start, stop };
}

/** Why nothing can be recorded here at all; null where it can. */
export function recordingClosed(): MicrophoneTrouble | null {
  if (!window.isSecureContext) return 'insecure';
  return recordingType() === null ? 'cannot' : null;
}

async function openMicrophone(): Promise<MediaStream | MicrophoneTrouble> {
  const closed = recordingClosed();
  if (closed !== null) return closed;
  try {
    return await navigator.mediaDevices.getUserMedia({
      audio: { channelCount: 1, echoCancellation: false, noiseSuppression: true, autoGainControl: true },
    });
  } catch (cause) {
    const name = cause instanceof DOMException ? cause.name : '';
    return name === 'NotFoundError' || name === 'OverconstrainedError' ? 'noMicrophone' : 'denied';
  }
}
