import { useTranslation } from 'react-i18next';
import type { Attachment } from '#shared/contracts/attachments.js';
import { More } from '#src/ui/fold.js';
import { partUrl } from '../api/attachments-api.js';
import { clockOf, secondsOf } from '../model/length-words.js';
import { AttachmentFoot } from './attachment-foot.js';
import { VoicePlayer } from './voice-player.js';
import { WordsPart } from './words-part.js';

/** One recording: listen, read what was said, hear the agreement. */
export function RecordingCard({ attachment }: { attachment: Attachment }) {
  const { t } = useTranslation('attachments');
  const { id, title, language, naming, parts, hasWordsAlone } = attachment;
  const speaker =
    attachment.speaker === '' && naming !== 'named' ? t(`somebody.${naming}`) : attachment.speaker;
  const sources = parts.map(({ part, seconds }) => ({
    part,
    source: partUrl(id, part),
    seconds: seconds ?? 0,
  }));
  const spoken = sources.filter(({ part }) => part > 0);
  const consent = sources.filter(({ part }) => part === 0);
  const name = t('card.recording', { speaker });
  return (
    <article className="attachment" aria-label={title === '' ? name : title}>
      <h3 className="own-words" lang={title === '' ? undefined : (language ?? undefined)}>
        {title === '' ? name : title}
      </h3>
      <p className="text-umber-soft">
        {title !== '' && `${name}. `}
        {spoken.length === 0
          ? t(hasWordsAlone ? 'card.wordsAlone' : 'card.incomplete')
          : t('card.parts', { count: spoken.length, length: clockOf(secondsOf(parts)) })}
      </p>
      {spoken.length > 0 && (
        <VoicePlayer key={spoken.length} name={t('player.name', { speaker })} parts={spoken} />
      )}
      {(spoken.length > 0 || hasWordsAlone) && <WordsPart attachment={attachment} />}
      {consent.length > 0 && (
        <More label={t('card.consentOf')}>
          <VoicePlayer name={t('consent.clip')} parts={consent} isClip />
        </More>
      )}
      <AttachmentFoot attachment={attachment} />
    </article>
  );
}
