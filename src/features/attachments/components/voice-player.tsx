import { Pause, Play, RotateCcw } from 'lucide-react';
import { useState, useSyncExternalStore } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import type { KeptPart } from '../model/kept-recordings.js';
import { clockOf } from '../model/length-words.js';
import { PartsPlayer, SPEEDS, type PlayerPart, type Speed } from '../model/parts-player.js';

/** What was recorded here, to be listened to before it is sent. */
export function keptSources(parts: readonly KeptPart[]): PlayerPart[] {
  return parts.map(({ content, seconds }) => ({ source: content, seconds }));
}

interface VoicePlayerProps {
  /** Read aloud: whose recording this is. */
  name: string;
  parts: readonly PlayerPart[];
  /** A short clip needs no speeds. */
  isClip?: boolean | undefined;
}

/** Listen, again from the beginning, slower. It never begins by itself. Give it a `key` that changes with the parts. */
export function VoicePlayer({ name, parts, isClip = false }: VoicePlayerProps) {
  const { t } = useTranslation('attachments');
  const [player] = useState(() => new PartsPlayer(parts));
  const { isPlaying, at, speed, isMissing } = useSyncExternalStore(player.subscribe, player.read);
  const length = parts.reduce((sum, { seconds }) => sum + seconds, 0);
  return (
    <div role="group" aria-label={name} className="voice-player">
      <div className="flex flex-wrap items-center gap-3">
        <Button
          className={isClip ? undefined : 'voice-play'}
          icon={
            isPlaying ? <Pause aria-hidden size={24} /> : <Play aria-hidden size={24} className="turns" />
          }
          onClick={() => {
            if (isPlaying) player.pause();
            else player.play();
          }}
        >
          {isPlaying ? t('player.pause') : t('player.listen')}
        </Button>
        {!isClip && (
          <Button
            look="quiet"
            icon={<RotateCcw aria-hidden size={20} />}
            onClick={() => {
              player.replay();
            }}
          >
            {t('player.replay')}
          </Button>
        )}
        {length > 0 && (
          <span className="tabular-nums text-umber-soft" aria-hidden>
            {t('player.place', { now: clockOf(at), all: clockOf(length) })}
          </span>
        )}
      </div>
      <span className="voice-line" aria-hidden>
        <i style={{ inlineSize: `${length === 0 ? 0 : Math.min(100, (at / length) * 100)}%` }} />
      </span>
      <p role="status" className="field-said empty:hidden">
        {isMissing && t('player.notThere')}
      </p>
      {!isClip && (
        <PickGroup<`${Speed}`>
          label={t('player.speed')}
          className="voice-speeds"
          value={`${speed}`}
          options={SPEEDS.map((value) => ({
            value: `${value}` as const,
            label: t('player.speedValue', { speed: value.toFixed(1) }),
          }))}
          onChange={(next) => {
            player.setSpeed(SPEEDS.find((value) => `${value}` === next) ?? 1);
          }}
        />
      )}
    </div>
  );
}
