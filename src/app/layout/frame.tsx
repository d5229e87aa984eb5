import { Suspense, type ReactNode } from 'react';
import { I18nProvider } from 'react-aria-components';
import { useTranslation } from 'react-i18next';
import { ScrollRestoration, useNavigation } from 'react-router-dom';
import { intlLocale } from '#src/lib/date-words.js';
import { useOfflineSince } from '#src/lib/online.js';
import { useSlow } from '#src/lib/slow.js';
import { classNames } from '#src/ui/class-names.js';
import { PictureDefs } from '#src/ui/pictures/picture-defs.js';
import { ToastProvider } from '#src/ui/toast.js';
import { OfflineLine } from '#src/ui/waiting.js';
import { FirstWait } from './first-wait.js';

/** What every screen stands in, with or without the rail. */
export function Frame({ rail, children }: { rail: ReactNode; children: ReactNode }) {
  const { t, i18n } = useTranslation('common');
  return (
    <I18nProvider locale={intlLocale(i18n.language)}>
      <div className={classNames('shell', rail !== null && 'with-rail')}>
        <ToastProvider>
          <a className="skip-link" href="#content">
            {t('skipToContent')}
          </a>
          <PictureDefs />
          {rail}
          <NetworkLine />
          <NavigationLine />
          <Suspense fallback={<FirstWait />}>{children}</Suspense>
          <ScrollRestoration />
        </ToastProvider>
      </div>
    </I18nProvider>
  );
}

function NetworkLine() {
  const { t, i18n } = useTranslation('common');
  const since = useOfflineSince();
  if (since === null) return null;
  const time = new Intl.DateTimeFormat(intlLocale(i18n.language), { hour: '2-digit', minute: '2-digit' });
  return <OfflineLine>{t('offline.since', { time: time.format(since) })}</OfflineLine>;
}

/** Said only while the next screen's code takes its time on a slow network. */
function NavigationLine() {
  const { t } = useTranslation('common');
  const isSlow = useSlow(useNavigation().state === 'loading');
  return (
    <div className="on-the-way" role="status">
      {isSlow && <span>{t('loading')}</span>}
    </div>
  );
}
