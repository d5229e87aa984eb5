import { useTranslation } from 'react-i18next';
import { TickField } from '#src/ui/field.js';

interface NatureSignsProps {
  /** As they stand in the table. */
  words: readonly string[];
  chosen: readonly string[];
  onChoose: (next: readonly string[]) => void;
}

/** Words that name no sign of the sky: whoever brings the table in says which of them grow, fly, blow or flow. */
export function NatureSigns({ words, chosen, onChoose }: NatureSignsProps) {
  const { t } = useTranslation('imports');
  if (words.length === 0) return null;
  return (
    <fieldset className="grid gap-2">
      <legend className="font-bold">{t('nature.title')}</legend>
      <p className="text-small">{t('nature.what')}</p>
      {words.map((word) => (
        <TickField
          key={word}
          label={t('nature.one', { word })}
          checked={chosen.includes(word)}
          onChange={(event) => {
            onChoose(
              event.currentTarget.checked ? [...chosen, word] : chosen.filter((each) => each !== word),
            );
          }}
        />
      ))}
    </fieldset>
  );
}
