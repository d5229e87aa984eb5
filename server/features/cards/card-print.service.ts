import type { CardPrint } from '#shared/contracts/cards.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { layoutSignInCard } from '#shared/sheet/sign-in-card.js';
import QRCode from 'qrcode';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { fileNameOf } from '../../print/file-name.js';
import { fontMeasurer } from '../../print/font-measurer.js';
import { renderPages } from '../../print/render-pages.js';
import { translatorFor } from '../../print/translator.js';
import { grouped } from '../session/one-time-codes.service.js';
import type { CardsService } from './cards.service.js';

/** The card on paper. What opens it comes with the request and is kept nowhere. */
export class CardPrintService {
  constructor(
    private readonly cards: CardsService,
    private readonly clock: Clock,
    private readonly publicUrl: string,
  ) {}

  async pdf(
    actor: Actor,
    personId: string,
    { code, name, size }: CardPrint,
  ): Promise<{ content: Buffer; fileName: string }> {
    const { villageName } = await this.cards.printable(actor, personId, code);
    const t = translatorFor(DEFAULT_LANGUAGE, 'cards');
    const address = `${this.publicUrl}/card`;
    // Behind the hash: what opens the card reaches no server's log.
    const { modules } = QRCode.create(`${address}#card=${code}`, { errorCorrectionLevel: 'M' });
    const page = layoutSignInCard(
      {
        size,
        title: t('print.title'),
        villageName,
        name,
        how: t('print.how'),
        care: t('print.care'),
        address: address.replace(/^https?:\/\//u, ''),
        codeGroups: grouped(code, 3).split('-'),
        squares: { size: modules.size, isDark: (row, column) => modules.get(row, column) === 1 },
      },
      fontMeasurer,
    );
    const content = await renderPages([page], {
      title: t('print.title'),
      author: villageName,
      language: DEFAULT_LANGUAGE,
      printDate: this.clock.now().toISOString().slice(0, 10),
    });
    return { content, fileName: fileNameOf(t('print.fileName', { village: villageName }), 'pdf') };
  }
}
