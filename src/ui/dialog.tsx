import { X } from 'lucide-react';
import type { ReactNode } from 'react';
import { Dialog as AriaDialog, Heading, Modal, ModalOverlay } from 'react-aria-components';
import { useTranslation } from 'react-i18next';
import { IconButton } from './button.js';

export interface DialogProps {
  title: ReactNode;
  isOpen: boolean;
  onClose: () => void;
  /** False where leaving by a click beside it would lose something. */
  closesBeside?: boolean | undefined;
  children: ReactNode;
}

/** A question in front of the screen: keeps the focus, closes with Escape, gives the focus back. */
export function Dialog({ title, isOpen, onClose, closesBeside = true, children }: DialogProps) {
  const { t } = useTranslation('common');
  return (
    <ModalOverlay
      className="dialog-back"
      isOpen={isOpen}
      isDismissable={closesBeside}
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
    >
      <Modal className="dialog-box">
        <AriaDialog>
          <div className="mb-3 flex items-start justify-between gap-3">
            <Heading slot="title" level={2}>
              {title}
            </Heading>
            <IconButton label={t('close')} icon={<X aria-hidden size={22} />} onClick={onClose} />
          </div>
          {children}
        </AriaDialog>
      </Modal>
    </ModalOverlay>
  );
}
