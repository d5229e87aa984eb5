import { existsSync, readFileSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import path from 'node:path';
import { pino, type Logger } from 'pino';
import type { DataSource } from 'typeorm';
import { createApp, WAITING_FILES } from './app.js';
import { ConfigError, readConfig, type Config } from './config/env.js';
import { createDataSource } from './db/data-source.js';
import { DatabaseUnfitError, migrate } from './db/migrate.js';
import { sweepOrphans } from './features/attachments/attachment-sweep.service.js';
import { holdsDemoAccounts, seedDemo } from './features/demo/demo.service.js';
import { removeWhatIsOver } from './features/privacy/retention.service.js';
import { firstStewardToken } from './features/session/first-start.service.js';
import type { Clock } from './http/context.js';
import { errorForLog } from './http/error-for-log.js';
import { openServer } from './http/timeouts.js';
import type { DevInbox } from './mail/inbox.js';
import { createSmtpMailer } from './mail/smtp-mailer.js';
import { AttachmentFilesService } from './features/attachments/attachment-files.service.js';
import { erasersOf } from './features/withdrawals/erasers.service.js';
import { replayWithdrawals } from './features/withdrawals/replay.service.js';
import { WithdrawalFile } from './storage/withdrawal-list.js';
import { commandScan } from './storage/file-scan.js';
import { LocalFileStore } from './storage/local-file-store.js';

const DAY_MS = 24 * 60 * 60 * 1000;

/** A reason not to start that the person at the machine can mend: one sentence, no stack. */
class StartRefused extends Error {}

async function main(): Promise<void> {
  const config = readConfig();
  const log = pino({ level: config.logLevel });
  const clock: Clock = { now: () => config.fixedNow ?? new Date() };
  const dataSource = createDataSource(config.database);
  await dataSource.initialize();
  try {
    await migrate(dataSource);
    await prepareAccounts(dataSource, config, clock);
    const storage = await openStorage(dataSource, config, log);
    const withdrawals = new WithdrawalFile(path.join(config.dataDir, 'withdrawals', 'list.jsonl'));
    const erasers = erasersOf(new AttachmentFilesService(storage, null), clock);
    const vanished = await replayWithdrawals(dataSource, erasers, withdrawals);
    if (vanished > 0) log.warn({ vanished }, 'things that were taken back had come back and are gone again');
    const inbox = await openInbox(config);
    const smtpUrl = inbox?.smtpUrl ?? config.mail.smtpUrl;
    const mailer = smtpUrl === null ? null : createSmtpMailer({ url: smtpUrl, from: config.mail.from });
    const { express, letters, endStreams, settled } = createApp({
      mailer,
      inbox,
      dataSource,
      config,
      clock,
      log,
      storage,
      withdrawals,
      scan: config.scanCommand === null ? null : commandScan(config.scanCommand),
      productVersion: productVersion(),
      clientDir: clientDir(),
    });
    const server = await listen(express, config);
    log.info({ address: config.publicUrl }, 'listening');
    tidyDaily(dataSource, clock, log);
    if (letters === null) log.info('letters by e-mail are off: SMTP_URL is not set');
    letters?.start(config.mail.roundMs, (error) => {
      log.warn({ err: errorForLog(error) }, 'letters wait for the next round');
    });
    closeOnSignal(server, log, endStreams, async () => {
      await settled();
      await letters?.close();
      await inbox?.close();
      await dataSource.destroy();
    });
  } catch (error) {
    await dataSource.destroy();
    throw error;
  }
}

async function prepareAccounts(dataSource: DataSource, config: Config, clock: Clock): Promise<void> {
  if (config.demo) {
    await seedDemo(dataSource, clock);
    return;
  }
  if (config.nodeEnv === 'production' && (await holdsDemoAccounts(dataSource))) {
    throw new StartRefused(
      `The database ${config.database.name} holds demo accounts, whose password everybody knows: set DB_NAME to another database, or run npm run db:reset.`,
    );
  }
  const token = await firstStewardToken(dataSource, clock);
  if (token !== null) {
    process.stdout.write(
      `\nNobody has an account yet. The first steward opens this link once, within a week:\n  ${config.publicUrl}/welcome#first-steward=${token}\n\n`,
    );
  }
}

/** What a process that ended in the middle left behind goes first: half files, and files that no row knows. */
async function openStorage(dataSource: DataSource, config: Config, log: Logger): Promise<LocalFileStore> {
  rmSync(path.join(config.dataDir, WAITING_FILES), { recursive: true, force: true });
  const storage = new LocalFileStore(path.join(config.dataDir, 'attachments'));
  const unfinished = await storage.removeUnfinished();
  const orphans = await sweepOrphans(dataSource, storage, new Date());
  if (unfinished + orphans > 0) log.info({ unfinished, orphans }, 'files of nobody were removed');
  return storage;
}

/** Loaded only where it is wanted, so that a product on a server never holds a mail server. */
async function openInbox({ mail }: Config): Promise<DevInbox | null> {
  if (mail.inboxPort === null) return null;
  const { startDevInbox } = await import('./mail/dev-inbox.js');
  return startDevInbox(mail.inboxPort);
}

function listen(express: ReturnType<typeof createApp>['express'], config: Config): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = openServer(express);
    server.once('error', (error) => {
      reject(
        new StartRefused(`PORT ${config.port} cannot be used (${error.message}): set PORT to a free one.`),
      );
    });
    server.listen(config.port, config.host, () => {
      resolve(server);
    });
  });
}

function tidyDaily(dataSource: DataSource, clock: Clock, log: Logger): void {
  const tidy = () => {
    removeWhatIsOver(dataSource.manager, clock.now()).catch((error: unknown) => {
      log.warn({ err: errorForLog(error) }, 'old sessions, letters, codes and cards stay for another day');
    });
  };
  tidy();
  // Never keeps the process alive by itself.
  setInterval(tidy, DAY_MS).unref();
}

/** Answers what has begun, then lets go of the database; a second signal does not hurry it into a loss. */
function closeOnSignal(
  server: Server,
  log: Logger,
  endStreams: () => void,
  letGo: () => Promise<void>,
): void {
  let closing = false;
  const close = () => {
    if (closing) return;
    closing = true;
    server.close(() => {
      void letGo().finally(() => {
        log.info('closed');
      });
    });
    endStreams();
    server.closeIdleConnections();
  };
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP'] as const) process.on(signal, close);
}

/** From source and from the build alike, the project is the nearest folder above with a package.json. */
function projectDir(): string {
  let folder = import.meta.dirname;
  while (!existsSync(path.join(folder, 'package.json'))) folder = path.dirname(folder);
  return folder;
}

function productVersion(): string {
  const { version } = JSON.parse(readFileSync(path.join(projectDir(), 'package.json'), 'utf8')) as {
    version: string;
  };
  return version;
}

/** Without a build (in development) Vite serves the pages. */
function clientDir(): string | null {
  const folder = path.join(projectDir(), 'dist', 'client');
  return existsSync(path.join(folder, 'index.html')) ? folder : null;
}

main().catch((error: unknown) => {
  const plain =
    error instanceof ConfigError || error instanceof DatabaseUnfitError || error instanceof StartRefused;
  process.stderr.write(`${plain ? error.message : String(error instanceof Error ? error.stack : error)}\n`);
  process.exitCode = 1;
});
