import { OPEN_PAGE_PATH } from '#shared/contracts/open-page-path.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { layoutOpenPageCard } from '#shared/sheet/open-page-card.js';
import QRCode from 'qrcode';
import type { DataSource } from 'typeorm';
import { OpenPageEntity } from '../../db/entities/open-page.entity.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { villageDay } from '../../policy/viewer.js';
import { dayInWords } from '../../print/day-in-words.js';
import { fileNameOf } from '../../print/file-name.js';
import { fontMeasurer } from '../../print/font-measurer.js';
import { renderPages } from '../../print/render-pages.js';
import { translatorFor } from '../../print/translator.js';

/** White around the code, in its own modules: readers need four. */
const QUIET_MODULES = 4;
const CORRECTION = { errorCorrectionLevel: 'M' } as const;

/** The address of the page on paper: the code by itself, and a card to hang up. */
export class OpenPageCardService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly publicUrl: string,
  ) {}

  /** The address as a picture. */
  async code(actor: Actor): Promise<string> {
    const { pageKey } = await this.page(actor);
    const address = this.address(pageKey).join('');
    return QRCode.toString(address, { type: 'svg', ...CORRECTION, margin: QUIET_MODULES });
  }

  async pdf(actor: Actor): Promise<{ content: Buffer; fileName: string }> {
    const { pageKey, community } = await this.page(actor);
    const today = await villageDay(this.dataSource.manager, actor.communityId, this.clock.now());
    const t = translatorFor(DEFAULT_LANGUAGE, 'open');
    const [place, key] = this.address(pageKey);
    const { modules } = QRCode.create(place + key, CORRECTION);
    const title = t('title', { village: community.name });
    const card = layoutOpenPageCard(
      {
        ...{ title, what: t('card.what'), forAll: t('card.forAll'), how: t('card.how') },
        squares: { size: modules.size, isDark: (row, column) => modules.get(row, column) === 1 },
        address: [place.replace(/^https?:\/\//u, ''), key],
        foot: [t('card.ends'), t('card.printed', { day: dayInWords(today, DEFAULT_LANGUAGE) })],
      },
      fontMeasurer,
    );
    const content = await renderPages([card], {
      ...{ title, author: community.name, language: DEFAULT_LANGUAGE, printDate: today },
    });
    return { content, fileName: fileNameOf(t('card.fileName', { village: community.name }), 'pdf') };
  }

  private address(pageKey: string): readonly [place: string, key: string] {
    return [`${this.publicUrl}${OPEN_PAGE_PATH}?page=`, pageKey];
  }

  private async page({ communityId }: Actor): Promise<OpenPageEntity> {
    const row = await this.dataSource.manager.findOne(OpenPageEntity, {
      where: { communityId },
      relations: { community: true },
    });
    if (row === null) throw notFound();
    return row;
  }
}
