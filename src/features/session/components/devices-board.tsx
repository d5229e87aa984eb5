import { useQuery } from '@tanstack/react-query';
import { LogOut, MonitorSmartphone } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Device } from '#shared/contracts/session.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button, IconButton } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { devicesQuery, useEndDevice, useEndOtherDevices } from '../api/devices-api.js';

/** Where the person is signed in: a lost phone is signed out from here. */
export function DevicesBoard() {
  const { t } = useTranslation('session');
  const words = useProblemWords();
  const say = useToast();
  const devices = useQuery(devicesQuery);
  const endOne = useEndDevice();
  const endOthers = useEndOtherDevices();
  const nameOf = useDeviceName();
  const tell = (cause: unknown) => {
    say(words.problem(cause));
  };
  const others = devices.data?.filter(({ here }) => !here) ?? [];
  return (
    <Board title={t('devices.title')}>
      {devices.isPending && <Skeleton lines={3} />}
      {devices.error !== null && (
        <TroubleNote sentence={words.problem(devices.error)} onRetry={() => void devices.refetch()} />
      )}
      <ul className="rows">
        {devices.data?.map((device) => (
          <DeviceRow
            key={device.id}
            device={device}
            name={nameOf(device)}
            onEnd={() => {
              endOne.mutate(device.id, {
                onSuccess: () => {
                  say(t('devices.ended', { device: nameOf(device) }));
                },
                onError: tell,
              });
            }}
          />
        ))}
      </ul>
      {others.length > 0 && (
        <div className="mt-3">
          <Button
            busy={endOthers.isPending}
            icon={<LogOut aria-hidden className="turns" size={20} />}
            onClick={() => {
              endOthers.mutate(undefined, {
                onSuccess: () => {
                  say(t('devices.othersEnded'));
                },
                onError: tell,
              });
            }}
          >
            {t('devices.endOthers')}
          </Button>
        </div>
      )}
    </Board>
  );
}

function DeviceRow({ device, name, onEnd }: { device: Device; name: string; onEnd: () => void }) {
  const { t } = useTranslation('session');
  const words = useDateWords();
  return (
    <li className="flex items-center gap-3 border-t border-hairline py-3 first:border-t-0">
      <MonitorSmartphone aria-hidden size={24} className="shrink-0" />
      <div className="min-w-0 flex-1">
        <p>
          <strong>{name}</strong>
          {device.here && <span className="text-umber-soft"> · {t('devices.here')}</span>}
        </p>
        <p className="text-small text-umber-soft">
          {device.beganAt !== null && t('devices.began', { when: words.moment(device.beganAt) })}{' '}
          {!device.here && t('devices.lastUsed', { when: words.moment(device.lastUsedAt) })}
        </p>
      </div>
      {!device.here && (
        <IconButton
          label={t('devices.end', { device: name })}
          icon={<LogOut aria-hidden className="turns" size={22} />}
          onClick={onEnd}
        />
      )}
    </li>
  );
}

function useDeviceName(): (device: Device) => string {
  const { t } = useTranslation('session');
  return ({ browser, system }) => {
    if (browser !== null && system !== null) return t('devices.name', { browser, system });
    return browser ?? system ?? t('devices.unknown');
  };
}
