import type { TestProject } from 'vitest/node';
import { startThrowAway } from '../../docker-free-scripts/lib/throw-away.mjs';

/** How to reach this run's MariaDB; the account may make and drop databases named dawnpeg…. */
export interface TestServer {
  readonly host: string;
  readonly port: number;
  readonly socketPath?: string;
  readonly user: string;
  readonly password: string;
}

declare module 'vitest' {
  interface ProvidedContext {
    mariadb: TestServer;
  }
}

/** One throw-away MariaDB for the whole run: started before the first test, gone after the last. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const server = await startThrowAway();
  project.provide('mariadb', {
    host: '127.0.0.1',
    port: server.port,
    ...(server.socket === null ? {} : { socketPath: server.socket }),
    user: server.user,
    password: server.password,
  });
  return () => server.remove();
}
