import { useQuery } from '@tanstack/react-query';
import { CloudRain, Megaphone } from 'lucide-react';
import { lazy, Suspense, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { RainDay } from '#shared/contracts/weather.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { weatherQuery } from '#src/lib/weather-query.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { More } from '#src/ui/fold.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton } from '#src/ui/waiting.js';
import { RainLine } from './rain-line.js';

export interface WeatherFormProps {
  communityId: string;
  /** The civil day at the village. */
  today: string;
  onDone: () => void;
}

/** The forms come when somebody writes something down. */
const NoticeForm = lazy(() => import('./notice-form.js'));
const RainForm = lazy(() => import('./rain-form.js'));

const SHOWN = 4;

/** On Today: the rain of the last days as a short list, and ways to write down rain or a notice. */
export function WeatherBoard() {
  const { communityId } = useCurrentCommunity();
  const { data } = useQuery(weatherQuery(communityId));
  if (data === undefined) return null;
  return (
    <Suspense fallback={null}>
      <RainOfLate communityId={communityId} today={data.today} rain={data.rain} />
    </Suspense>
  );
}

interface RainOfLateProps {
  communityId: string;
  today: string;
  rain: readonly RainDay[];
}

function RainOfLate({ communityId, today, rain }: RainOfLateProps) {
  const { t } = useTranslation('weather');
  const mayTell = useRoles().is('officer', 'steward');
  const [written, setWritten] = useState<'notice' | 'rain' | null>(null);
  const close = () => {
    setWritten(null);
  };
  const list = (days: readonly RainDay[]) => (
    <ul className="grid gap-1">
      {days.map((day) => (
        <li key={day.id}>
          <RainLine communityId={communityId} rain={day} />
        </li>
      ))}
    </ul>
  );
  const Form = written === 'notice' ? NoticeForm : RainForm;
  return (
    <Board title={t('board.title')}>
      <h3 className="text-body text-umber-soft">{t('board.rain')}</h3>
      {rain.length === 0 ? <p>{t('board.noRain')}</p> : list(rain.slice(0, SHOWN))}
      {rain.length > SHOWN && <More label={t('board.all')}>{list(rain.slice(SHOWN))}</More>}
      <div className="mt-3 flex flex-wrap gap-3">
        <Button
          icon={<CloudRain aria-hidden size={20} />}
          onClick={() => {
            setWritten('rain');
          }}
        >
          {t('board.writeRain')}
        </Button>
        {mayTell && (
          <Button
            icon={<Megaphone aria-hidden size={20} />}
            onClick={() => {
              setWritten('notice');
            }}
          >
            {t('board.writeNotice')}
          </Button>
        )}
      </div>
      <Dialog
        title={t(written === 'notice' ? 'form.noticeTitle' : 'form.rainTitle')}
        isOpen={written !== null}
        onClose={close}
        closesBeside={false}
      >
        <Suspense fallback={<Skeleton lines={4} />}>
          <Form communityId={communityId} today={today} onDone={close} />
        </Suspense>
      </Dialog>
    </Board>
  );
}
