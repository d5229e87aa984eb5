import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { startBuiltServer } from '../../docker-free-scripts/lib/product-server.mjs';
import { freshJourneyDatabase } from './journey-database.js';
import { journeyEnvironment } from './journey-environment.js';

interface Running {
  readonly story: string;
  readonly address: string;
  stop(): Promise<void>;
}

/**
 * The built product for one worker of Playwright. Each file of journeys is a story that begins with fresh demo
 * villages: files run in any order, side by side, and none has to tidy up after itself.
 */
export class JourneyProduct {
  private running: Running | null = null;
  private stories = 0;

  constructor(private readonly workerIndex: number) {}

  /** Where the product of this story listens; the tests of one file follow each other on the same data. */
  async addressFor(story: string): Promise<string> {
    if (this.running?.story !== story) {
      await this.stop();
      this.running = await this.start(story);
    }
    return this.running.address;
  }

  async stop(): Promise<void> {
    await this.running?.stop();
    this.running = null;
  }

  private async start(story: string): Promise<Running> {
    this.stories += 1;
    const dataDir = mkdtempSync(path.join(os.tmpdir(), `dawnpeg-test-${process.pid}-files-`));
    const removeFiles = () => {
      rmSync(dataDir, { recursive: true, force: true });
    };
    try {
      const server = await startBuiltServer({
        ...process.env,
        ...(await freshJourneyDatabase(`dawnpeg_journey_${this.workerIndex}_${this.stories}`)),
        ...(await journeyEnvironment(dataDir)),
      });
      return {
        story,
        address: server.address,
        stop: async () => {
          await server.stop();
          removeFiles();
        },
      };
    } catch (error) {
      removeFiles();
      throw error;
    }
  }
}
