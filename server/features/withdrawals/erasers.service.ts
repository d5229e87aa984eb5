import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { KeptReadEntity } from '../../db/entities/kept-read.entity.js';
import type { Clock } from '../../http/context.js';
import {
  eraseAttachments,
  eraseAttachmentsOf,
  eraseSound,
  type ErasedFiles,
} from '../attachments/attachment-eraser.service.js';
import type { AttachmentFilesService } from '../attachments/attachment-files.service.js';
import { eraseDraftEntry, leadByStarInstead } from '../calendars/entry-eraser.service.js';
import { eraseConsents } from '../consents/consent-eraser.service.js';
import { eraseFigureRow, eraseStory } from '../figures/figure-eraser.service.js';
import { eraseNote, eraseNotesOf } from '../notes/note-eraser.service.js';
import { eraseSeasonOf } from '../season-reviews/season-eraser.service.js';
import { eraseSign } from '../signs/sign-eraser.service.js';
import { forgetRolledDays, sameInOtherYears } from '../rollovers/same-things.service.js';
import {
  eraseFrozenEntry,
  eraseFrozenFigure,
  eraseFrozenSign,
  eraseFrozenVariant,
  variantIdsOf,
} from '../versions/frozen-eraser.service.js';
import type { WithdrawnPart } from '../../storage/withdrawal-list.js';
import type { Erased, Eraser } from './eraser.service.js';

/** The erasers of the parts that there are. A new part that keeps what people gave adds its own. */
export function erasersOf(files: AttachmentFilesService, clock: Clock): Eraser[] {
  const attached = (erased: ErasedFiles): Erased => ({
    withIt: erased.attachmentIds.map((itemId) => ({ itemType: 'attachment' as const, itemId })),
    afterwards: () => files.remove(erased.files),
  });
  const whole: Eraser[] = [
    only('entry', async (manager, { itemId, leavesTrace }) => {
      const answers = await manager.findBy(AnswerEntity, { entryId: itemId });
      const spoken = await eraseAttachmentsOf(
        manager,
        'answer',
        answers.map(({ id }) => id),
      );
      // A paper that shows what is taken back goes with it; the other answers on it keep their words.
      const papers = answers.flatMap(({ proof, proofId }) => (proof === 'paper' && proofId ? [proofId] : []));
      const shown = await eraseAttachmentsOf(manager, 'meeting', [...new Set(papers)]);
      const variants = await variantIdsOf(manager, itemId);
      const published = await eraseFrozenEntry(manager, itemId, leavesTrace);
      await eraseSeasonOf(manager, itemId);
      await eraseDraftEntry(manager, itemId);
      const { withIt = [], ...rest } = attached(together(spoken, shown));
      const beside = variants.map((id) => ({ itemType: 'variant' as const, itemId: id }));
      return { ...rest, published, withIt: [...withIt, ...beside] };
    }),
    only('variant', async (manager, { itemId }) => {
      await manager.delete(EntryVariantEntity, { id: itemId });
      return { published: await eraseFrozenVariant(manager, itemId) };
    }),
    async (manager, { itemType, itemId }) =>
      itemType === 'entry' || itemType === 'figure' || itemType === 'note'
        ? attached(await eraseAttachmentsOf(manager, itemType, [itemId]))
        : {},
    alsoElsewhere,
    only('note', async (manager, { itemId }) => {
      await eraseNote(manager, itemId);
      return {};
    }),
    async (manager, { itemType, itemId }) => {
      if (itemType !== 'entry' && itemType !== 'figure') return {};
      const noteIds = await eraseNotesOf(manager, itemType, itemId);
      return { withIt: noteIds.map((id) => ({ itemType: 'note' as const, itemId: id })) };
    },
    only('figure', async (manager, { communityId, itemId }) => {
      const { markerKey, indicatorHr, entries } = await eraseFigureRow(manager, communityId, itemId);
      await leadByStarInstead(manager, entries, indicatorHr, clock.now());
      const told = await eraseAttachmentsOf(manager, 'marker', [markerKey]);
      const remarked = await eraseNotesOf(manager, 'marker', markerKey);
      const published = await eraseFrozenFigure(manager, communityId, markerKey);
      const { withIt = [], ...rest } = attached(told);
      const notes = remarked.map((id) => ({ itemType: 'note' as const, itemId: id }));
      return { ...rest, published, withIt: [...withIt, ...notes, { itemType: 'story', itemId }] };
    }),
    only('story', async (manager, { itemId }) => {
      await eraseStory(manager, itemId);
      return {};
    }),
    only('sign', async (manager, { itemId }) => {
      await eraseSign(manager, itemId);
      return { published: await eraseFrozenSign(manager, itemId) };
    }),
    only('attachment', async (manager, { itemId }) => attached(await eraseAttachments(manager, [itemId]))),
    async (manager, { itemType, itemId }) => {
      const consentIds = await eraseConsents(manager, itemType, itemId);
      return attached(await eraseAttachmentsOf(manager, 'consent', consentIds));
    },
    async (manager, { itemId }) => {
      await manager.delete(KeptReadEntity, { itemId });
      return {};
    },
  ];
  return [
    ...whole.map((erase) => ofPart('all', erase)),
    ofPart('sound', alsoElsewhere),
    ofPart(
      'sound',
      only('attachment', async (manager, { itemId }) => attached(await eraseSound(manager, itemId))),
    ),
  ];
}

/** The same thing in other drafts, and in versions of other years, goes with it. */
const alsoElsewhere: Eraser = async (manager, { itemType, itemId }) => {
  const others = await sameInOtherYears(manager, itemType, itemId);
  await forgetRolledDays(manager, itemId);
  return { withIt: others.map((id) => ({ itemType, itemId: id })) };
};

function ofPart(part: WithdrawnPart, erase: Eraser): Eraser {
  return (manager, erasing) => (erasing.part === part ? erase(manager, erasing) : Promise.resolve({}));
}

function together(first: ErasedFiles, second: ErasedFiles): ErasedFiles {
  return {
    attachmentIds: [...first.attachmentIds, ...second.attachmentIds],
    files: [...first.files, ...second.files],
  };
}

function only(itemType: SharedItemType, erase: Eraser): Eraser {
  return (manager: EntityManager, erasing) =>
    erasing.itemType === itemType ? erase(manager, erasing) : Promise.resolve({});
}
