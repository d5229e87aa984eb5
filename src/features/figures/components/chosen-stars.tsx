import { X } from 'lucide-react';
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import type { ChartStar } from '#shared/contracts/figures.js';
import { IconButton } from '#src/ui/button.js';
import { FieldNotes } from '#src/ui/field.js';

export interface ChosenStarsProps {
  stars: readonly ChartStar[];
  indicatorHr: number | null;
  nameOf: (star: ChartStar) => string;
  problem: string | undefined;
  onLead: (hr: number) => void;
  onTakeOut: (hr: number) => void;
}

/** The figure's stars: which one leads, and a key to take each out. */
export function ChosenStars({ stars, indicatorHr, nameOf, problem, onLead, onTakeOut }: ChosenStarsProps) {
  const { t } = useTranslation('figures');
  const name = useId();
  return (
    <fieldset id="figure-indicatorHr" tabIndex={-1}>
      <legend className="field-label">{t('form.leading')}</legend>
      <ul className="grid gap-2">
        {stars.map((star) => (
          <li key={star.hr} className="flex items-stretch gap-2">
            <label className="pick min-w-0 flex-1">
              <input
                type="radio"
                name={name}
                checked={star.hr === indicatorHr}
                onChange={() => {
                  onLead(star.hr);
                }}
              />
              <span className="ring" aria-hidden />
              <span>{star.hr === indicatorHr ? t('form.leads', { star: nameOf(star) }) : nameOf(star)}</span>
            </label>
            <IconButton
              label={t('picker.takeOut', { star: nameOf(star) })}
              icon={<X aria-hidden size={22} />}
              onClick={() => {
                onTakeOut(star.hr);
              }}
            />
          </li>
        ))}
      </ul>
      <FieldNotes inputId={name} hint={t('form.leadingHint')} problem={problem} />
    </fieldset>
  );
}
