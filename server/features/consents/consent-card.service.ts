import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { layoutConsentCard } from '#shared/sheet/consent-card.js';
import type { DataSource } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import type { Actor } from '../../http/actor.js';
import { fileNameOf } from '../../print/file-name.js';
import { fontMeasurer } from '../../print/font-measurer.js';
import { renderPages } from '../../print/render-pages.js';
import { translatorFor } from '../../print/translator.js';
import { toConsentCard } from './consent-card.mapper.js';
import type { ConsentsService } from './consents.service.js';

/** The copy on paper for whoever was asked. */
export class ConsentCardService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly consents: ConsentsService,
  ) {}

  async pdf(actor: Actor, consentId: string): Promise<{ content: Buffer; fileName: string }> {
    const consent = await this.consents.read(actor, consentId);
    const community = await this.dataSource.manager.findOneByOrFail(CommunityEntity, {
      id: actor.communityId,
    });
    const model = toConsentCard(consent, community.name, DEFAULT_LANGUAGE);
    const { giverName, askedOn } = consent.content;
    const content = await renderPages(layoutConsentCard(model, fontMeasurer), {
      title: `${model.title}: ${giverName}`,
      author: community.name,
      language: DEFAULT_LANGUAGE,
      printDate: askedOn,
    });
    const t = translatorFor(DEFAULT_LANGUAGE, 'consents');
    return { content, fileName: fileNameOf(t('card.fileName', { name: giverName, day: askedOn }), 'pdf') };
  }
}
