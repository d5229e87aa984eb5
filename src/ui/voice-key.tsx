import { Pause, Play } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { Button } from './button.js';

/** Plays one short sound. It never begins by itself, and stops when it leaves the screen. */
export function VoiceKey({ label, source }: { label: string; source: string }) {
  const sound = useRef<HTMLAudioElement | null>(null);
  const [isPlaying, setIsPlaying] = useState(false);
  useEffect(
    () => () => {
      sound.current?.pause();
    },
    [],
  );
  const press = () => {
    if (isPlaying) {
      sound.current?.pause();
      setIsPlaying(false);
      return;
    }
    if (sound.current === null) {
      sound.current = new Audio(source);
      sound.current.addEventListener('ended', () => {
        setIsPlaying(false);
      });
    }
    setIsPlaying(true);
    void sound.current.play().catch(() => {
      setIsPlaying(false);
    });
  };
  return (
    <Button
      aria-pressed={isPlaying}
      icon={isPlaying ? <Pause aria-hidden size={22} /> : <Play aria-hidden size={22} className="turns" />}
      onClick={press}
    >
      {label}
    </Button>
  );
}
