import path from 'node:path';
import { run, start } from './processes.mjs';
import { projectDir } from './settings.mjs';

const tsx = path.join(projectDir, 'node_modules/.bin/tsx');
/** Our own condition of package.json "imports": take the TypeScript sources, not the build. */
const condition = '--conditions=dawnpeg-source';

/**
 * Runs a TypeScript file of the project to its end and shows what it writes.
 *
 * @param {string[]} words the file and its arguments
 * @param {NodeJS.ProcessEnv} env
 */
export async function sourceTool(words, env) {
  return run(tsx, [condition, ...words], { cwd: projectDir, env, show: true });
}

/**
 * Starts a TypeScript file of the project, again whenever a source changes.
 *
 * @param {string} file
 * @param {NodeJS.ProcessEnv} env
 */
export function watchSource(file, env) {
  return start(tsx, ['watch', condition, '--clear-screen=false', file], { cwd: projectDir, env });
}
