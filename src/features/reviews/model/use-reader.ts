import { useEffect, useState } from 'react';
import { keep, readKept } from '#src/lib/device-storage.js';

/** Slower than people speak, for older ears; the browser's own pace is 1. */
export const PACES = { slow: 0.8, calm: 0.9, plain: 1 } as const;
export type Pace = keyof typeof PACES;

export interface Reader {
  /** False where this browser has no voice for the language: then nothing is offered. */
  canRead: boolean;
  isReading: boolean;
  pace: Pace;
  read: (sentences: readonly string[]) => void;
  stop: () => void;
  choosePace: (pace: Pace) => void;
}

const KEPT_PACE = 'reader.pace';

function speech(): SpeechSynthesis | null {
  return (globalThis as { speechSynthesis?: SpeechSynthesis }).speechSynthesis ?? null;
}

/** Reads sentences with a voice of this device. Never by itself; it stops when the component leaves the screen. */
export function useReader(language: string): Reader {
  const voice = useVoice(language);
  const [isReading, setIsReading] = useState(false);
  const [pace, setPace] = useState(keptPace);
  useEffect(
    () => () => {
      speech()?.cancel();
    },
    [],
  );
  const stop = () => {
    speech()?.cancel();
    setIsReading(false);
  };
  const read = (sentences: readonly string[]) => {
    const engine = speech();
    if (engine === null || voice === null) return;
    engine.cancel();
    // Sentence by sentence: long texts are cut off by some browsers.
    for (const [index, sentence] of sentences.entries()) {
      const utterance = new SpeechSynthesisUtterance(sentence);
      utterance.voice = voice;
      utterance.lang = voice.lang;
      utterance.rate = PACES[pace];
      if (index === sentences.length - 1) {
        utterance.onend = () => {
          setIsReading(false);
        };
      }
      engine.speak(utterance);
    }
    setIsReading(sentences.length > 0);
  };
  const choosePace = (next: Pace) => {
    stop();
    keep(KEPT_PACE, next);
    setPace(next);
  };
  return { canRead: voice !== null, isReading, pace, read, stop, choosePace };
}

/** A voice for the language, once the browser has told which it has. One that stays on this device is preferred. */
function useVoice(language: string): SpeechSynthesisVoice | null {
  const [voices, setVoices] = useState<readonly SpeechSynthesisVoice[]>(() => speech()?.getVoices() ?? []);
  useEffect(() => {
    const engine = speech();
    if (engine === null) return undefined;
    const look = () => {
      setVoices(engine.getVoices());
    };
    engine.addEventListener('voiceschanged', look);
    return () => {
      engine.removeEventListener('voiceschanged', look);
    };
  }, []);
  const primary = language.split('-')[0]?.toLowerCase();
  const able = voices.filter(({ lang }) => lang.split(/[-_]/u)[0]?.toLowerCase() === primary);
  // What elders read is never sent to a speech service elsewhere.
  return able.find(({ localService }) => localService) ?? null;
}

function keptPace(): Pace {
  const kept = readKept(KEPT_PACE);
  return typeof kept === 'string' && kept in PACES ? (kept as Pace) : 'calm';
}
