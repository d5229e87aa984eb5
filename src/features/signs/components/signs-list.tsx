import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Sign } from '#shared/contracts/signs.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { signsQuery } from '#src/lib/sign-queries.js';
import { VillageList } from '#src/lib/village-list.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { SignCard } from './sign-card.js';
import { SignForm } from './sign-form.js';

/** The village's signs; officers and elders add them, everybody says when one was seen. */
export function SignsList() {
  const { t } = useTranslation('signs');
  const { communityId } = useCurrentCommunity();
  const mayAdd = useRoles().is('officer', 'elder');
  const query = useQuery(signsQuery(communityId));
  const [written, setWritten] = useState<Sign | 'new' | null>(null);
  const close = () => {
    setWritten(null);
  };
  return (
    <>
      <VillageList
        query={query}
        add={
          mayAdd ? (
            <Button
              icon={<Plus aria-hidden size={20} />}
              onClick={() => {
                setWritten('new');
              }}
            >
              {t('list.add')}
            </Button>
          ) : null
        }
        none={{ title: t('list.none'), hint: t('list.noneHint') }}
        lead={t('list.lead')}
        card={(sign) => <SignCard sign={sign} onChange={sign.mine ? () => setWritten(sign) : null} />}
      />
      <Dialog
        title={t(written === 'new' ? 'form.new' : 'form.change')}
        isOpen={written !== null}
        onClose={close}
        closesBeside={false}
      >
        {written !== null && (
          <SignForm communityId={communityId} sign={written === 'new' ? null : written} onDone={close} />
        )}
      </Dialog>
    </>
  );
}
