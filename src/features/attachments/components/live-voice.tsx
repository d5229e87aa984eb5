import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { clockOf } from '../model/length-words.js';

const LOOKS_MS = 100;
/** People breathe between words: only a longer silence is one. */
const SILENCE_S = 3;
/** How much louder than silence a voice is, of the loudest that the microphone can say. */
const HEARD = 0.015;
/** The bar is full long before that: people do not shout. */
const FULL = 0.3;

/** That it records, for how long, and whether the microphone hears anything: for ears that do not. */
export function LiveVoice({ stream, before, part }: { stream: MediaStream; before: number; part: number }) {
  const { t } = useTranslation('attachments');
  const [seconds, setSeconds] = useState(0);
  const [loudness, setLoudness] = useState(0);
  const [heardAtS, setHeardAtS] = useState(0);
  const read = useLoudness(stream);
  useEffect(() => {
    const from = performance.now();
    const timer = setInterval(() => {
      const nowS = (performance.now() - from) / 1000;
      const loudNow = read.current();
      setSeconds(nowS);
      setLoudness(loudNow);
      if (loudNow > HEARD) setHeardAtS(nowS);
    }, LOOKS_MS);
    return () => {
      clearInterval(timer);
    };
  }, [read]);
  const isHeard = seconds - heardAtS < SILENCE_S;
  return (
    <div className="live-voice">
      <p className="flex flex-wrap items-center gap-3">
        <span className="live-dot" aria-hidden />
        <strong>{t('voice.running')}</strong>
        <span className="text-date tabular-nums" role="timer">
          {clockOf(before + seconds)}
        </span>
        {part > 1 && <span className="text-umber-soft">{t('voice.part', { part })}</span>}
      </p>
      <span className="voice-line loud" role="img" aria-label={t('voice.level')}>
        <i style={{ inlineSize: `${Math.min(100, (loudness / FULL) * 100)}%` }} />
      </span>
      <p className="text-small text-umber-soft" aria-hidden>
        {isHeard ? t('voice.soundComes') : t('voice.silence')}
      </p>
    </div>
  );
}

/** Root mean square of the present sound, from 0 to 1. */
function useLoudness(stream: MediaStream) {
  const read = useRef<() => number>(() => 0);
  useEffect(() => {
    if (typeof AudioContext === 'undefined') return;
    const context = new AudioContext();
    const analyser = context.createAnalyser();
    analyser.fftSize = 1024;
    const source = context.createMediaStreamSource(stream);
    source.connect(analyser);
    const samples = new Float32Array(analyser.fftSize);
    read.current = () => {
      analyser.getFloatTimeDomainData(samples);
      return Math.sqrt(samples.reduce((sum, sample) => sum + sample * sample, 0) / samples.length);
    };
    return () => {
      read.current = () => 0;
      source.disconnect();
      void context.close();
    };
  }, [stream]);
  return read;
}
