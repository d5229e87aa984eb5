import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { ConsentLink } from '#src/features/consents/components/consent-link.js';
import { NotesPanel, type NotedText } from '#src/features/notes/components/notes-panel.js';
import { SharingPanel } from '#src/features/sharing/components/sharing-panel.js';
import type { SharingValue } from '#src/lib/sharing-fields.js';
import type { ItemRef } from '#src/lib/sharing-queries.js';
import { TakeBackLink } from '#src/lib/take-back-link.js';
import { Board } from '#src/ui/surfaces.js';
import { VoicesOfNote } from './voices-of-note.js';

export interface AboutItemProps {
  item: ItemRef & { itemType: 'entry' | 'figure' };
  /** Texts of the thing, in which a note can be pinned to a word. */
  texts: readonly NotedText[];
  /** Boards of their own, or parts of the page or the dialog that they stand on. */
  look?: 'boards' | 'plain' | undefined;
  wanted?: SharingValue | null | undefined;
  onSettled?: (() => void) | undefined;
  onHidden?: (() => void) | undefined;
}

/**
 * What belongs to a thing besides its own words, wherever it is shown: voices and pictures, notes, who may see it, what
 * was agreed, and the way to take it back.
 */
export function AboutItem({ item, texts, look = 'boards', ...sharing }: AboutItemProps) {
  const { t } = useTranslation(['sharing', 'notes']);
  const { communityId, itemType, itemId } = item;
  return (
    <>
      <AttachmentsPanel
        key={`voices ${itemId}`}
        look={look === 'plain' ? 'plain' : 'board'}
        communityId={communityId}
        subject={{ subjectType: itemType, subjectId: itemId }}
      />
      <Part look={look} title={t('notes:title')}>
        <NotesPanel
          key={itemId}
          thing={{ communityId, subjectType: itemType, subjectId: itemId }}
          texts={texts}
          voices={(note, begins) => <VoicesOfNote communityId={communityId} note={note} begins={begins} />}
        />
      </Part>
      <Part look={look} title={t('title')}>
        <SharingPanel key={itemId} item={item} {...sharing} />
        <div className="mt-3 grid justify-items-start gap-3">
          <ConsentLink itemType={itemType} itemId={itemId} />
          <TakeBackLink {...item} />
        </div>
      </Part>
    </>
  );
}

function Part({ look, title, children }: { look: 'boards' | 'plain'; title: string; children: ReactNode }) {
  if (look === 'boards') return <Board title={title}>{children}</Board>;
  return (
    <section className="grid gap-2">
      <h2>{title}</h2>
      {children}
    </section>
  );
}
