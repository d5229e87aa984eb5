import { useRef } from 'react';
import { useTranslation } from 'react-i18next';
import type { NoteField, NotePin } from '#shared/contracts/notes.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Well } from '#src/ui/surfaces.js';
import type { NotedText } from './notes-panel.js';

type WordsPin = Extract<NotePin, { at: 'words' }>;

export interface QuoteFieldProps {
  pin: WordsPin;
  texts: readonly NotedText[];
  problem: string | undefined;
  onChange: (pin: WordsPin) => void;
}

/** Which text, and which words of it: marked in the text and taken over, or typed. */
export function QuoteField({ pin, texts, problem, onChange }: QuoteFieldProps) {
  const { t } = useTranslation('notes');
  const shown = useRef<HTMLParagraphElement>(null);
  const filled = texts.filter(({ text }) => text !== '');
  const text = filled.find(({ field }) => field === pin.field)?.text ?? '';
  const takeMarked = () => {
    const selection = getSelection();
    const isInside = selection !== null && shown.current?.contains(selection.anchorNode) === true;
    const quote = isInside ? selection.toString().replace(/\s+/gu, ' ').trim() : '';
    if (quote !== '') onChange({ ...pin, quote: quote.slice(0, 200) });
  };
  return (
    <div className="grid gap-3">
      {filled.length > 1 && (
        <SelectField
          label={t('whichText')}
          value={pin.field}
          onChange={(event) => {
            onChange({ at: 'words', field: event.currentTarget.value as NoteField, quote: '' });
          }}
        >
          {filled.map(({ field }) => (
            <option key={field} value={field}>
              {t(`field.${field}`)}
            </option>
          ))}
        </SelectField>
      )}
      <Well>
        <p ref={shown} className="own-words whitespace-pre-line break-words">
          {text}
        </p>
      </Well>
      <div>
        <Button onClick={takeMarked}>{t('takeMarked')}</Button>
      </div>
      <TextField
        label={t('quote')}
        hint={t('quoteHint')}
        value={pin.quote}
        problem={problem}
        autoComplete="off"
        onChange={(event) => {
          onChange({ ...pin, quote: event.currentTarget.value });
        }}
      />
    </div>
  );
}
