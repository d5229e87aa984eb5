import { Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useRoles } from '#src/lib/community.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { EmptyState } from '#src/ui/waiting.js';

/** A village without a place has no dates: the next step is to add one. */
export function NoPlace() {
  const { t } = useTranslation('stars');
  const mayAdd = useRoles().is('officer');
  return (
    <EmptyState
      title={t('noPlace')}
      action={
        mayAdd ? (
          <ButtonLink to={paths.newPlace()} icon={<Plus aria-hidden size={20} />}>
            {t('addPlace')}
          </ButtonLink>
        ) : undefined
      }
    >
      {mayAdd ? t('noPlaceHint') : t('noPlaceHintOthers')}
    </EmptyState>
  );
}
