import { Plus, X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { FIGURE_NAME_MAX, FIGURE_NAMES_MAX } from '#shared/contracts/figures.js';
import type { Language } from '#shared/contracts/people.js';
import { Button, IconButton } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import type { FigurePart } from './figure-form-parts.js';

/** The village's own word first, then the same in other languages. */
export function NamesBoard({
  draft,
  change,
  problem,
  languages,
}: FigurePart & { languages: readonly Language[] }) {
  const { t } = useTranslation('figures');
  const setRow = (index: number, patch: { tag?: string; name?: string }) => {
    change({ names: draft.names.map((row, at) => (at === index ? { ...row, ...patch } : row)) });
  };
  return (
    <Board title={t('form.names')}>
      <div className="grid gap-4">
        {draft.names.map(({ tag, name }, index) => {
          const known = languages.find((language) => language.tag === tag);
          return (
            <div key={index} className="flex flex-wrap items-end gap-3">
              {known === undefined && (
                <TextField
                  className="w-32"
                  label={t('form.languageTag')}
                  value={tag}
                  autoCapitalize="none"
                  spellCheck={false}
                  dir="ltr"
                  onChange={(event) => {
                    setRow(index, { tag: event.currentTarget.value });
                  }}
                />
              )}
              <TextField
                id={`figure-names.${index}`}
                className="min-w-0 flex-[1_1_14rem]"
                label={known === undefined ? t('form.nameElse') : t('form.nameIn', { language: known.name })}
                hint={index === 0 ? t('form.nameHint') : undefined}
                value={name}
                problem={problem(`names.${index}`)}
                maxLength={FIGURE_NAME_MAX}
                autoComplete="off"
                lang={tag === '' ? undefined : tag}
                onChange={(event) => {
                  setRow(index, { name: event.currentTarget.value });
                }}
              />
              {known === undefined && (
                <IconButton
                  label={t('form.nameOut')}
                  icon={<X aria-hidden size={22} />}
                  onClick={() => {
                    change({ names: draft.names.filter((_, at) => at !== index) });
                  }}
                />
              )}
            </div>
          );
        })}
        {draft.names.length < FIGURE_NAMES_MAX && (
          <div>
            <Button
              look="quiet"
              icon={<Plus aria-hidden size={20} />}
              onClick={() => {
                change({ names: [...draft.names, { tag: '', name: '' }] });
              }}
            >
              {t('form.nameMore')}
            </Button>
          </div>
        )}
      </div>
    </Board>
  );
}
