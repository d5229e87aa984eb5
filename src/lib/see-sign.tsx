import { lazy, Suspense, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Button, type ButtonLook } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { Skeleton } from '#src/ui/waiting.js';
import type { SeeFieldsProps } from './see-fields.js';

/** The form comes when somebody presses the button: most look at Today and have seen nothing new. */
const SeeFields = lazy(() => import('./see-fields.js'));

interface SeeSignProps extends Omit<SeeFieldsProps, 'onDone'> {
  label: ReactNode;
  look?: ButtonLook | undefined;
  about?: string | undefined;
}

/** A button by which anybody says that a sign was seen. */
export function SeeSign({ label, look, about, ...asked }: SeeSignProps) {
  const { t } = useTranslation('signs');
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        look={look}
        aria-label={about}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {label}
      </Button>
      <Dialog title={t('see.title')} isOpen={isOpen} onClose={close} closesBeside={false}>
        <Suspense fallback={<Skeleton lines={4} />}>
          <SeeFields {...asked} onDone={close} />
        </Suspense>
      </Dialog>
    </>
  );
}
