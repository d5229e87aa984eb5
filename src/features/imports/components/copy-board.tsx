import { useQuery } from '@tanstack/react-query';
import { Copy, ListChecks } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { useCommunityChoice } from '#src/lib/community.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { everyCalendarQuery, useCopy } from '../api/imports-api.js';
import { useStoppable } from '../model/use-stoppable.js';
import { CopiedTable } from './copied-table.js';
import { LongWork } from './long-work.js';

/** For somebody who compiles for several villages; for everybody else there is nothing to see. */
export function CopyBoard({ calendar }: { calendar: Calendar }) {
  const { memberships } = useCommunityChoice();
  const elsewhere = memberships
    .filter(({ communityId, roles }) => communityId !== calendar.communityId && roles.includes('officer'))
    .map(({ communityId }) => communityId);
  if (elsewhere.length === 0) return null;
  return <Copying calendar={calendar} elsewhere={elsewhere} />;
}

function Copying({ calendar, elsewhere }: { calendar: Calendar; elsewhere: readonly string[] }) {
  const { t } = useTranslation('imports');
  const every = useQuery(everyCalendarQuery());
  const targets = (every.data ?? []).filter(
    ({ communityId, locked }) => elsewhere.includes(communityId) && !locked,
  );
  const [chosenId, setChosenId] = useState<string | null>(null);
  const [key, setKey] = useState(() => crypto.randomUUID() as string);
  const look = useCopy(calendar.id);
  const copy = useCopy(calendar.id);
  const work = useStoppable();
  const toCalendarId = chosenId ?? targets[0]?.id ?? null;
  const target = targets.find(({ id }) => id === toCalendarId);
  const send = (dryRun: boolean) =>
    (dryRun ? look : copy).mutate({ toCalendarId: toCalendarId ?? '', key, dryRun, signal: work.begin() });
  return (
    <Board title={t('copy.title')}>
      <p className="text-small">{t('copy.what')}</p>
      {every.data && targets.length === 0 && <p className="mt-3">{t('copy.none')}</p>}
      {target !== undefined && (
        <div className="mt-3 grid gap-3">
          <SelectField
            label={t('copy.to')}
            value={target.id}
            onChange={(event) => {
              setChosenId(event.currentTarget.value);
              setKey(crypto.randomUUID());
              look.reset();
              copy.reset();
            }}
          >
            {targets.map(({ id, communityName, placeName, year }) => (
              <option key={id} value={id}>
                {t('copy.option', { village: communityName, place: placeName, year })}
              </option>
            ))}
          </SelectField>
          <Button
            icon={<ListChecks aria-hidden size={20} />}
            onClick={() => {
              copy.reset();
              send(true);
            }}
          >
            {t('copy.look')}
          </Button>
          <LongWork
            isPending={look.isPending || copy.isPending}
            problem={copy.error ?? look.error}
            doing={t(copy.isPending ? 'bring.sending' : 'bring.looking')}
            work={work}
          />
          {look.data && <CopiedTable entries={look.data.entries} year={target.year} />}
          {look.data && look.data.mediaLeft > 0 && (
            <p className="text-small">{t('copy.mediaLeft', { count: look.data.mediaLeft })}</p>
          )}
          {copy.data ? (
            <p role="status">{t('copy.done', { count: copy.data.added })}</p>
          ) : (
            look.data &&
            look.data.added > 0 && (
              <Button
                look="main"
                busy={copy.isPending}
                icon={<Copy aria-hidden size={20} />}
                onClick={() => {
                  send(false);
                }}
              >
                {t('copy.do', { count: look.data.added })}
              </Button>
            )
          )}
        </div>
      )}
    </Board>
  );
}
