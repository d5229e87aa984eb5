/** `npm run check`: types, lint, format, import rules and unused code, one check each. */
import { showCheck } from './lib/show-check.mjs';
import { runChecks } from './lib/checks.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { listenForEnd } from './lib/processes.mjs';
import { runScript } from './lib/say.mjs';
import { requireNode20 } from './lib/settings.mjs';

await runScript(async () => {
  requireNode20();
  const { orGoOn } = listenForEnd();
  await ensureNodePackages();
  orGoOn();
  const { passed, failed } = await runChecks(showCheck);
  process.stdout.write(`${passed} passed, ${failed} failed\n`);
  return failed === 0 ? 0 : 1;
});
