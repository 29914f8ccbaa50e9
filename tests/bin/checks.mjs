import { freemem } from 'node:os';
import { cleanEnvironment, runCommand } from '../../server/bin/commands.mjs';
import { inProject } from '../../server/bin/project.mjs';

const SCRIPTS = { format: 'format:check', lint: 'lint', types: 'typecheck' };
const ADVICE = { format: 'Run "npm run format" to mend it.', lint: 'The rules are in eslint.config.js.', types: '' };
// Lint and type check each hold the whole program in memory; side by side they want about this much.
const ROOM_FOR_BOTH_BYTES = 4e9;

async function runCheck(name, { signal, say }) {
  const began = Date.now();
  const parameters = ['run', '--silent', SCRIPTS[name]];
  const options = { cwd: inProject(), env: cleanEnvironment({ FORCE_COLOR: '0' }), signal };
  const { code, output } = await runCommand('npm', parameters, options);
  const seconds = ((Date.now() - began) / 1000).toFixed(1);
  if (code === 0) say(`✓ ${name} (${seconds} s)`);
  else say(`✗ ${name} (${seconds} s)\n${output.trimEnd()}\n${ADVICE[name]}`);
  return code === 0;
}

/**
 * Runs the checks of form, lint and types, side by side where the memory allows; a failed one stops none of the rest.
 * @param {string[]} names
 * @returns {Promise<{ passed: number, failed: number }>} each check counted as one test
 */
export async function runChecks(names, options) {
  const lanes = [names.filter((name) => name !== 'types'), names.filter((name) => name === 'types')];
  const rows = freemem() > ROOM_FOR_BOTH_BYTES ? lanes : [lanes.flat()];
  const results = await Promise.all(
    rows.map(async (row) => {
      const outcomes = [];
      for (const name of row) outcomes.push(await runCheck(name, options));
      return outcomes;
    }),
  );
  const passed = results.flat().filter(Boolean).length;
  return { passed, failed: names.length - passed };
}
