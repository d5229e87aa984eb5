import { spawn } from 'node:child_process';
import path from 'node:path';

const projectDir = path.resolve(import.meta.dirname, '../..');

export interface Started {
  /** Resolves when the script has printed its last words of a start. */
  readonly ready: Promise<void>;
  /** The exit code. */
  readonly ended: Promise<number | null>;
  readonly output: () => string;
  readonly kill: (signal: NodeJS.Signals) => void;
}

/** Runs a script of `docker-free-scripts` with these settings and nothing else of this process. */
export function startScript(words: readonly string[], settings: Record<string, string>): Started {
  const child = spawn(process.execPath, words, {
    cwd: projectDir,
    env: { PATH: process.env['PATH'], ...settings },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const ended = new Promise<number | null>((resolve) => {
    child.once('close', resolve);
  });
  const ready = new Promise<void>((resolve, reject) => {
    for (const stream of [child.stdout, child.stderr])
      stream.setEncoding('utf8').on('data', (text: string) => {
        output += text;
        if (output.includes('Ctrl-C stops it')) resolve();
      });
    void ended.then(() => {
      reject(new Error(`it ended before it was ready:\n${output}`));
    });
  });
  ready.catch(() => undefined);
  return { ready, ended, output: () => output, kill: (signal) => child.kill(signal) };
}
