import { Copy } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Version } from '#shared/contracts/versions.js';
import { Button } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';

/** The version's hash, and how anybody can reckon it again. */
export function SealBoard({ version }: { version: Version }) {
  const { t } = useTranslation('versions');
  const say = useToast();
  return (
    <Board title={t('seal.title')}>
      <p className="text-small">{t('seal.lead')}</p>
      <dl className="mt-2">
        <div className="fact">
          <dt>{t('seal.version')}</dt>
          <dd>
            <Seal hash={version.hash} />
          </dd>
        </div>
        <div className="fact">
          <dt>{t('seal.header')}</dt>
          <dd>
            <Seal hash={version.headerHash} />
          </dd>
        </div>
      </dl>
      <div className="mt-2 flex flex-wrap items-center gap-x-4">
        <Button
          icon={<Copy aria-hidden size={20} />}
          onClick={() => {
            void navigator.clipboard.writeText(version.hash).then(() => {
              say(t('seal.copied'));
            });
          }}
        >
          {t('seal.copy')}
        </Button>
        <More label={t('seal.how')}>
          <p className="text-small">{t('seal.howEntry')}</p>
          <p className="mt-1 text-small">{t('seal.howVersion')}</p>
        </More>
      </div>
    </Board>
  );
}

const GROUP = 8;

/** Sixty-four digits in groups of eight, to be read and compared by eye. */
export function Seal({ hash }: { hash: string }) {
  const groups = Array.from({ length: Math.ceil(hash.length / GROUP) }, (_, index) =>
    hash.slice(index * GROUP, (index + 1) * GROUP),
  );
  return <code className="seal">{groups.join(' ')}</code>;
}
