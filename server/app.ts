import { OPEN_PAGE_PATH } from '#shared/contracts/open-page-path.js';
import compression from 'compression';
import express, { type Express } from 'express';
import helmet from 'helmet';
import { randomUUID } from 'node:crypto';
import path from 'node:path';
import { pinoHttp } from 'pino-http';
import { onCommittedWrite } from './db/committed-writes.js';
import { afterDeathRoutes } from './features/after-death/after-death.routes.js';
import { AfterDeathService } from './features/after-death/after-death.service.js';
import { airRoutes } from './features/air/air.routes.js';
import { AirService } from './features/air/air.service.js';
import { AttachmentFilesService } from './features/attachments/attachment-files.service.js';
import { ListedMediaService } from './features/attachments/listed-media.service.js';
import { ReturningMediaService } from './features/attachments/returning-media.service.js';
import { AttachmentReadingService } from './features/attachments/attachment-reading.service.js';
import { AttachmentWordsService } from './features/attachments/attachment-words.service.js';
import { attachmentsRoutes } from './features/attachments/attachments.routes.js';
import { AttachmentsService } from './features/attachments/attachments.service.js';
import { ProofsService } from './features/attachments/proofs.service.js';
import { AuditListService } from './features/audit/audit-list.service.js';
import { auditRoutes } from './features/audit/audit.routes.js';
import { calendarsRoutes } from './features/calendars/calendars.routes.js';
import { CalendarsService } from './features/calendars/calendars.service.js';
import { DraftGlanceService } from './features/calendars/draft-glance.service.js';
import { EntriesService } from './features/calendars/entries.service.js';
import { SkyDatesService } from './features/calendars/sky-dates.service.js';
import { ConsentCardService } from './features/consents/consent-card.service.js';
import { consentsRoutes } from './features/consents/consents.routes.js';
import { ConsentsService } from './features/consents/consents.service.js';
import { driftRoutes } from './features/drift/drift.routes.js';
import { DriftService } from './features/drift/drift.service.js';
import { exportsRoutes } from './features/exports/exports.routes.js';
import { ExportsService } from './features/exports/exports.service.js';
import { FeedsService } from './features/exports/feeds.service.js';
import { finderRoutes } from './features/finder/finder.routes.js';
import { FinderService } from './features/finder/finder.service.js';
import { CarriedMediaService } from './features/imports/carried-media.service.js';
import { CopyingService } from './features/imports/copying.service.js';
import { FileImportService } from './features/imports/file-import.service.js';
import { TableImportService } from './features/imports/table-import.service.js';
import { importsRoutes } from './features/imports/imports.routes.js';
import { openPageServices } from './features/open-page/open-page-services.js';
import { openPageRoutes } from './features/open-page/open-page.routes.js';
import { LetterChoicesService } from './features/letters/letter-choices.service.js';
import { LetterPlannerService } from './features/letters/letter-planner.service.js';
import { LetterRounds } from './features/letters/letter-rounds.service.js';
import { LetterSenderService } from './features/letters/letter-sender.service.js';
import { LetterWriterService } from './features/letters/letter-writer.service.js';
import { lettersRoutes } from './features/letters/letters.routes.js';
import { LettersService } from './features/letters/letters.service.js';
import { CommunitiesService } from './features/people/communities.service.js';
import { peopleRoutes } from './features/people/people.routes.js';
import { PeopleService } from './features/people/people.service.js';
import { weatherRoutes } from './features/weather/weather.routes.js';
import { WeatherService } from './features/weather/weather.service.js';
import { wordListsRoutes } from './features/word-lists/word-lists.routes.js';
import { WordListsService } from './features/word-lists/word-lists.service.js';
import { signsRoutes } from './features/signs/signs.routes.js';
import { OwnSightingsService } from './features/signs/own-sightings.service.js';
import { SignsService } from './features/signs/signs.service.js';
import { figuresRoutes } from './features/figures/figures.routes.js';
import { FiguresService } from './features/figures/figures.service.js';
import { helpingRoutes } from './features/helping/helping.routes.js';
import { HelpingService } from './features/helping/helping.service.js';
import { healthRoutes } from './features/health/health.routes.js';
import { HealthService } from './features/health/health.service.js';
import { notesRoutes } from './features/notes/notes.routes.js';
import { NotesService } from './features/notes/notes.service.js';
import { moonsRoutes } from './features/moons/moons.routes.js';
import { MoonsService } from './features/moons/moons.service.js';
import { seasonReviewsRoutes } from './features/season-reviews/season-reviews.routes.js';
import { SeasonReviewsService } from './features/season-reviews/season-reviews.service.js';
import { SeasonTasksService } from './features/season-reviews/season-tasks.service.js';
import { SeasonWordsService } from './features/season-reviews/season-words.service.js';
import { rolloversRoutes } from './features/rollovers/rollovers.routes.js';
import { RolloversService } from './features/rollovers/rollovers.service.js';
import { AnswersService } from './features/reviews/answers.service.js';
import { OwnAnswersService } from './features/reviews/own-answers.service.js';
import { reviewsRoutes } from './features/reviews/reviews.routes.js';
import { MeetingsService } from './features/reviews/meetings.service.js';
import { SigningService } from './features/reviews/signing.service.js';
import { LookCardService } from './features/look/look-card.service.js';
import { LookSeasonService } from './features/look/look-season.service.js';
import { lookRoutes } from './features/look/look.routes.js';
import { LookService } from './features/look/look.service.js';
import { placesRoutes } from './features/places/places.routes.js';
import { PlacesService } from './features/places/places.service.js';
import { LeavingService } from './features/privacy/leaving.service.js';
import { OwnDataService } from './features/privacy/own-data.service.js';
import { privacyRoutes } from './features/privacy/privacy.routes.js';
import { DevicesService } from './features/session/devices.service.js';
import { createPassport } from './features/session/passport.js';
import { sessionRoutes } from './features/session/session.routes.js';
import { SessionService } from './features/session/session.service.js';
import { erasersOf } from './features/withdrawals/erasers.service.js';
import { ItemStatesService } from './features/withdrawals/item-states.service.js';
import { WithdrawalsService } from './features/withdrawals/withdrawals.service.js';
import { withdrawalsRoutes } from './features/withdrawals/withdrawals.routes.js';
import type { WithdrawalList } from './storage/withdrawal-list.js';
import { actualDaysRoutes } from './features/actual-days/actual-days.routes.js';
import { ActualDaysService } from './features/actual-days/actual-days.service.js';
import { variantsRoutes } from './features/variants/variants.routes.js';
import { VariantsService } from './features/variants/variants.service.js';
import { GroupsService } from './features/sharing/groups.service.js';
import { ItemSharingService } from './features/sharing/item-sharing.service.js';
import { sharingRoutes } from './features/sharing/sharing.routes.js';
import { sheetsRoutes } from './features/sheets/sheets.routes.js';
import { ReadBackService } from './features/sheets/read-back.service.js';
import { SheetsService } from './features/sheets/sheets.service.js';
import { SkyMarkerYearsService } from './features/sky-markers/sky-marker-years.service.js';
import { skyMarkersRoutes } from './features/sky-markers/sky-markers.routes.js';
import { SkyMarkersService } from './features/sky-markers/sky-markers.service.js';
import { SkyYearsService } from './features/stars/sky-years.service.js';
import { SkylineEffectsService } from './features/stars/skyline-effects.service.js';
import { starsRoutes } from './features/stars/stars.routes.js';
import { StarsService } from './features/stars/stars.service.js';
import { ComingMarkersService } from './features/today/coming-markers.service.js';
import { todayRoutes } from './features/today/today.routes.js';
import { TodayService } from './features/today/today.service.js';
import { WaitingService } from './features/today/waiting.service.js';
import { CardPrintService } from './features/cards/card-print.service.js';
import { CardSignInService } from './features/cards/card-sign-in.service.js';
import { cardsRoutes } from './features/cards/cards.routes.js';
import { CardsService } from './features/cards/cards.service.js';
import { ComparisonService } from './features/versions/comparison.service.js';
import { decadesRoutes } from './features/decades/decades.routes.js';
import { DecadesService } from './features/decades/decades.service.js';
import { TodaysEngineService } from './features/versions/todays-engine.service.js';
import { RestoringService } from './features/versions/restoring.service.js';
import { WhyMovedService } from './features/versions/why-moved.service.js';
import { FrozenContentService } from './features/versions/frozen-content.service.js';
import { PublishingService } from './features/versions/publishing.service.js';
import { versionsRoutes } from './features/versions/versions.routes.js';
import { VersionsService } from './features/versions/versions.service.js';
import type { AppContext } from './http/context.js';
import { csrfProtection } from './http/csrf.js';
import { BODY_LIMIT } from './http/limits.js';
import { Mount } from './http/mount.js';
import { nothingHere, problemHandler } from './http/problem-handler.js';
import { sessions } from './http/session.js';
import { inboxPage } from './mail/inbox-page.js';
import type { DevInbox } from './mail/inbox.js';
import type { Mailer } from './mail/mailer.js';
import type { FileScan } from './storage/file-scan.js';
import type { FileStore } from './storage/file-store.js';

/** Below DATA_DIR: files that came with a call which is not answered yet. */
export const WAITING_FILES = 'waiting';

export interface AppOptions extends AppContext {
  /** Null where letters are switched off. */
  mailer: Mailer | null;
  /** The inbox of development, to be read at /dev/letters; null everywhere else. */
  inbox?: DevInbox | null;
  /** Keeps what people record and photograph. */
  storage: FileStore;
  /** What was taken back, kept beside the database. */
  withdrawals: WithdrawalList;
  /** Looks at every file before it is kept; null where there is no scanner. */
  scan?: FileScan | null;
  productVersion: string;
  /** Folder of the built client; null in tests and in development, where Vite serves it. */
  clientDir: string | null;
}

export interface App {
  /** Looks what waits and sends what is due; null where letters are switched off. */
  letters: LetterRounds | null;
  express: Express;
  /** Ends the answers that go on, which a stopping server would wait for; no other begins. */
  endStreams: () => void;
  /** Waits for the calls that have begun, also where whoever called has hung up. */
  settled: () => Promise<void>;
  /** Ids of the endpoints that answer. */
  mountedIds: readonly string[];
}

/** Wires the features. It never listens and never reads the environment. */
export function createApp(options: AppOptions): App {
  const { dataSource, clock, config, log, productVersion, clientDir } = options;
  const app = express();
  app.set('trust proxy', config.trustProxy);
  app.disable('x-powered-by');
  app.use(
    pinoHttp({
      logger: log,
      genReqId: () => randomUUID(),
      // Addresses of people and their words stay out of the log.
      serializers: {
        req: (request: { id: unknown; method: unknown; url: unknown }) => ({
          id: request.id,
          method: request.method,
          path: String(request.url).split('?')[0],
        }),
        res: (response: { statusCode: unknown }) => ({ status: response.statusCode }),
      },
      customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'error' : 'debug'),
    }),
  );
  app.use(
    helmet({
      contentSecurityPolicy: {
        directives: {
          'default-src': ["'self'"],
          'img-src': ["'self'", 'data:', 'blob:'],
          'media-src': ["'self'", 'blob:'],
          'style-src': ["'self'", "'unsafe-inline'"],
          'upgrade-insecure-requests': config.secureCookies ? [] : null,
        },
      },
      strictTransportSecurity: config.secureCookies,
    }),
  );
  app.use(compression());

  const sessionService = new SessionService(dataSource, clock);
  const cardSignIn = new CardSignInService(dataSource, clock);
  const passport = createPassport(sessionService, cardSignIn);
  const router = express.Router();
  router.use('/api', express.json({ limit: BODY_LIMIT, strict: false }));
  router.use('/api', sessions(options), passport.initialize() as never, passport.session() as never);
  router.use('/api', csrfProtection);

  const helping = new HelpingService(dataSource, clock, cardSignIn);
  const mount = new Mount(router, dataSource, path.join(config.dataDir, WAITING_FILES), {
    helpedIn: (request, helper) => helping.helped(request.session, helper),
    provePin: (communityId, personId, pin) => cardSignIn.provePin(communityId, personId, pin),
  });
  healthRoutes(mount, new HealthService(dataSource), productVersion);
  const stateOf = sessionRoutes(router, mount, {
    service: sessionService,
    cards: cardSignIn,
    devices: new DevicesService(dataSource, clock),
    helping,
    passport,
    clock,
    cardMinutes: config.cardSessionMinutes,
  });
  helpingRoutes(router, mount, helping, stateOf);
  const cards = new CardsService(dataSource, clock);
  cardsRoutes(mount, cards, new CardPrintService(cards, clock, config.publicUrl));
  peopleRoutes(mount, new PeopleService(dataSource, clock), new CommunitiesService(dataSource, clock));

  const places = new PlacesService(dataSource, clock);
  const skyYears = new SkyYearsService();
  const stars = new StarsService(places, skyYears);
  placesRoutes(mount, places);
  figuresRoutes(mount, new FiguresService(dataSource, clock));
  const weather = new WeatherService(dataSource, clock);
  weatherRoutes(mount, weather);
  signsRoutes(mount, new SignsService(dataSource, clock), new OwnSightingsService(dataSource, clock));
  wordListsRoutes(mount, new WordListsService(dataSource, clock));
  starsRoutes(mount, stars, new SkylineEffectsService(places, skyYears));
  moonsRoutes(mount, new MoonsService(places, skyYears));
  airRoutes(mount, new AirService(places, skyYears));

  finderRoutes(mount, new FinderService(places));
  driftRoutes(mount, new DriftService(places));

  const skyMarkerYears = new SkyMarkerYearsService();
  skyMarkersRoutes(mount, new SkyMarkersService(places, skyMarkerYears));

  const sky = new SkyDatesService(skyYears, skyMarkerYears);
  const contents = new FrozenContentService(dataSource, clock, sky);
  const versions = new VersionsService(dataSource, clock);
  const publishing = new PublishingService(dataSource, clock, contents, versions);
  const calendars = new CalendarsService(dataSource, clock);
  const entries = new EntriesService(dataSource, clock, sky);
  calendarsRoutes(mount, calendars, entries, new DraftGlanceService(dataSource, clock));
  const stopWatching = onCommittedWrite(dataSource, (communityId) => {
    mount.streams.wake(communityId);
  });
  decadesRoutes(mount, new DecadesService(dataSource, contents, sky));
  const whyMoved = new WhyMovedService(sky);
  rolloversRoutes(mount, new RolloversService(dataSource, clock, sky, whyMoved));
  seasonReviewsRoutes(
    mount,
    new SeasonReviewsService(dataSource, clock, contents, weather),
    new SeasonWordsService(dataSource, clock),
    new SeasonTasksService(dataSource, clock),
  );
  notesRoutes(mount, new NotesService(dataSource, clock));
  variantsRoutes(mount, new VariantsService(dataSource, clock, sky));
  versionsRoutes(
    mount,
    versions,
    publishing,
    new ComparisonService(contents, whyMoved),
    new RestoringService(dataSource, clock),
    new TodaysEngineService(dataSource, contents, sky),
  );
  const attachmentFiles = new AttachmentFilesService(options.storage, options.scan ?? null);
  const proofs = new ProofsService(attachmentFiles, clock);
  const answers = new AnswersService(dataSource, clock, cardSignIn, proofs);
  const ownAnswers = new OwnAnswersService(dataSource, clock);
  const meetings = new MeetingsService(dataSource, clock, proofs);
  const signing = new SigningService(dataSource, clock, versions);
  reviewsRoutes(mount, answers, ownAnswers, signing, meetings);
  const erasers = erasersOf(attachmentFiles, clock);
  const withdrawals = new WithdrawalsService(dataSource, clock, erasers, options.withdrawals);
  attachmentsRoutes(
    mount,
    new AttachmentsService(dataSource, clock, attachmentFiles, withdrawals),
    new AttachmentReadingService(dataSource, clock, options.storage),
    new AttachmentWordsService(dataSource, clock),
  );
  const readBack = new ReadBackService(dataSource, contents, clock);
  sheetsRoutes(mount, new SheetsService(contents, versions, weather, clock), readBack);
  const feeds = new FeedsService(dataSource, clock, contents);
  const media = new ListedMediaService(dataSource, clock, options.storage);
  exportsRoutes(router, mount, new ExportsService(contents, clock, media, dataSource), feeds);
  const returning = new ReturningMediaService(dataSource, clock, attachmentFiles);
  const carried = new CarriedMediaService(media, attachmentFiles, returning);
  importsRoutes(mount, {
    files: new FileImportService(dataSource, clock, options.withdrawals, carried),
    tables: new TableImportService(dataSource, clock, sky),
    copying: new CopyingService(dataSource, clock, sky, contents, media),
  });
  openPageRoutes(router, mount, openPageServices(dataSource, clock, contents, config.publicUrl));
  const consents = new ConsentsService(dataSource, clock, proofs);
  const coming = new ComingMarkersService(skyYears, stars);
  const waiting = new WaitingService(versions, answers, ownAnswers);
  const actualDays = new ActualDaysService(dataSource, clock);
  actualDaysRoutes(mount, actualDays);
  const afterDeath = new AfterDeathService(dataSource, clock, withdrawals);
  const today = { places, calendars, contents, coming, waiting, consents, afterDeath, actualDays, clock };
  todayRoutes(mount, new TodayService(today));
  const letters = new LettersService(dataSource, clock, config.sessionSecret, options.mailer !== null);
  lettersRoutes(router, mount, letters, new LetterChoicesService(dataSource, clock, letters.on));
  const looks = new LookService(places, new LookSeasonService(skyYears), clock);
  lookRoutes(mount, looks, new LookCardService(looks));
  afterDeathRoutes(mount, afterDeath);
  withdrawalsRoutes(mount, withdrawals, new ItemStatesService(dataSource, clock));
  const operator = { hosting: config.hosting, sendsLetters: options.mailer !== null };
  privacyRoutes(
    mount,
    new OwnDataService(dataSource, clock, operator),
    new LeavingService(dataSource, clock, withdrawals, cardSignIn),
  );
  sharingRoutes(mount, new GroupsService(dataSource, clock), new ItemSharingService(dataSource, clock));
  consentsRoutes(mount, consents, new ConsentCardService(dataSource, consents));
  auditRoutes(mount, new AuditListService(dataSource, clock));

  app.use(router);
  app.use('/api', nothingHere);
  if (options.inbox) serveInbox(app, options.inbox);
  if (clientDir !== null) serveClient(app, clientDir);
  app.use(nothingHere);
  app.use(problemHandler(log));
  return {
    express: app,
    endStreams: () => {
      stopWatching();
      mount.streams.close();
    },
    settled: () => mount.settled(),
    mountedIds: mount.ids,
    letters: letterRounds(options),
  };
}

function letterRounds({ dataSource, clock, config, mailer }: AppOptions): LetterRounds | null {
  if (mailer === null) return null;
  const writer = new LetterWriterService(dataSource, clock, {
    publicUrl: config.publicUrl,
    serverSecret: config.sessionSecret,
    from: config.mail.from,
  });
  const sender = new LetterSenderService(dataSource, clock, writer, mailer);
  return new LetterRounds(new LetterPlannerService(dataSource, clock), sender);
}

function serveInbox(app: Express, inbox: DevInbox): void {
  app.get('/dev/letters', (_request, response) => {
    response.setHeader('Cache-Control', 'no-store');
    response.send(inboxPage(inbox.letters()));
  });
}

/** Files of the build never change under their name; every other path is a page of the client. */
function serveClient(app: Express, clientDir: string): void {
  app.use('/assets', express.static(path.join(clientDir, 'assets'), { immutable: true, maxAge: '1y' }));
  app.use(express.static(clientDir, { index: false, maxAge: '1h' }));
  app.get('/{*page}', (request, response, next) => {
    if (request.accepts('html') === false) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    // What a village shows to whoever has the address is not for search engines.
    if (request.path === OPEN_PAGE_PATH) response.setHeader('X-Robots-Tag', 'noindex, nofollow');
    response.sendFile(path.join(clientDir, 'index.html'));
  });
}
