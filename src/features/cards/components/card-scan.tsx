import { ScanLine } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { canScan, useCardScan } from '../model/use-card-scan.js';

/** Reads the squares of a card where the browser can; elsewhere nothing is offered and the letters are typed. */
export function CardScan({ onFound }: { onFound: (code: string) => void }) {
  const { t } = useTranslation('cards');
  const [scans, setScans] = useState(false);
  if (!canScan()) return null;
  const toggle = () => {
    setScans(!scans);
  };
  if (!scans) {
    return (
      <Button full icon={<ScanLine aria-hidden size={24} />} onClick={toggle}>
        {t('door.scan')}
      </Button>
    );
  }
  return (
    <Scanning
      onFound={(found) => {
        setScans(false);
        onFound(found);
      }}
      onStop={toggle}
    />
  );
}

function Scanning({ onFound, onStop }: { onFound: (code: string) => void; onStop: () => void }) {
  const { t } = useTranslation('cards');
  const { video, isClosed } = useCardScan(onFound);
  if (isClosed) {
    return (
      <Care role="alert">
        <p>{t('door.noCamera')}</p>
      </Care>
    );
  }
  return (
    <div className="grid gap-2">
      <p role="status">{t('door.scanning')}</p>
      <video ref={video} className="w-full" muted playsInline aria-label={t('door.scanning')} />
      <Button look="quiet" onClick={onStop}>
        {t('door.scanStop')}
      </Button>
    </div>
  );
}
