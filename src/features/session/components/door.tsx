import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { usePageTitle } from '#src/lib/page-title.js';
import { RailIcon } from '#src/ui/icons/rail-icon.js';

/** A screen before the door: the product's name, one board, one thing to do. */
export function Door({ title, lead, children }: { title: string; lead?: ReactNode; children: ReactNode }) {
  const { t } = useTranslation('common');
  usePageTitle(title);
  return (
    <main id="content" tabIndex={-1} className="door">
      <p className="door-brand">
        <RailIcon place="mark" size={44} />
        {t('productName')}
      </p>
      <h1>{title}</h1>
      {lead !== undefined && <p>{lead}</p>}
      {children}
    </main>
  );
}
