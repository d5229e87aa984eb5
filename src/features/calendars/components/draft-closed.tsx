import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';

/** For people who read what is published: drafts are not for everybody. */
export function DraftClosed({ calendar }: { calendar: Calendar }) {
  const { t } = useTranslation('calendars');
  const title = t('editor.title', { year: calendar.year });
  usePageTitle(title);
  const { published } = calendar;
  return (
    <Page>
      <Mast title={title} under={calendar.placeName} backTo={paths.calendars()} />
      <Board className="max-w-form" title={t('closed.title')}>
        <p>{t('closed.hint')}</p>
        <div className="mt-4">
          {published === null ? (
            <ButtonLink to={paths.calendars()}>{t('closed.toList')}</ButtonLink>
          ) : (
            <ButtonLink to={paths.version(calendar.id, published.number)}>
              {t('closed.toPublished', { label: published.label })}
            </ButtonLink>
          )}
        </div>
      </Board>
    </Page>
  );
}
