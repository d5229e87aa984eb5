import { useQuery } from '@tanstack/react-query';
import { Pencil, Plus, X } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Variant } from '#shared/contracts/variants.js';
import { VariantList } from '#src/lib/variant-list.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { useRemoveVariant, variantsQuery } from '../api/variant-queries.js';
import type { FormState } from '../model/form-state.js';
import type { Editor } from '../model/use-editor.js';
import { BoardChoice } from './board-choice.js';
import { VariantForm } from './variant-form.js';

/** Other keepers' timings beside an entry that is saved, and what the board shows of them. */
export function VariantsPanel({ editor, form }: { editor: Editor; form: FormState }) {
  const { t } = useTranslation('variants');
  const say = useToast();
  const variants = useQuery(variantsQuery(form.calendarId, form.entryId));
  const remove = useRemoveVariant(form.calendarId, form.entryId);
  const [open, setOpen] = useState<Variant | 'new' | null>(null);
  const close = () => {
    setOpen(null);
  };
  const items = variants.data ?? [];
  return (
    <section className="mt-4 grid gap-3" aria-label={t('title')}>
      <h3>{t('title')}</h3>
      <p className="text-small text-umber-soft">{items.length === 0 ? t('none') : t('lead')}</p>
      <VariantList
        variants={items}
        year={form.year}
        markers={form.markers ?? new Map()}
        actions={(variant) =>
          variant.mine && (
            <p className="flex flex-wrap gap-2">
              <Button look="quiet" icon={<Pencil aria-hidden size={18} />} onClick={() => setOpen(variant)}>
                {t('change')}
              </Button>
              <Button
                look="quiet"
                icon={<X aria-hidden size={18} />}
                onClick={() => {
                  remove.mutate(variant.variantId, { onSuccess: () => say(t('takenOut')) });
                }}
              >
                {t('takeOut')}
              </Button>
            </p>
          )
        }
      />
      <BoardChoice form={form} variants={items} />
      {open === null ? (
        <div>
          <Button look="quiet" icon={<Plus aria-hidden size={20} />} onClick={() => setOpen('new')}>
            {t('add')}
          </Button>
        </div>
      ) : (
        <VariantForm
          key={open === 'new' ? 'new' : open.variantId}
          editor={editor}
          beside={form}
          saved={open === 'new' ? null : open}
          onClose={close}
        />
      )}
    </section>
  );
}
