/** `npm test`: everything, on a fresh clone too. Runs every part even when one fails, and says at the end what did. */
import { spawn } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureInstalled } from '../api/cli/install.mjs';
import { findChromium } from './chromium.mjs';

const ROOT = join(dirname(fileURLToPath(import.meta.url)), '..');

const PARTS = [
  { name: 'types', script: 'check:types' },
  { name: 'lint', script: 'lint' },
  { name: 'format', script: 'format:check' },
  { name: 'unit specs', script: 'test:unit', counted: true },
  { name: 'API tests', script: 'test:api', counted: true },
  { name: 'app specs', script: 'test:app', counted: true },
  { name: 'journeys', script: 'test:e2e', counted: true },
];

/** The closing lines of jasmine and of karma's progress reporter. */
const JASMINE = /^(\d+) specs?, (\d+) failures?/m;
const KARMA = /Executed (\d+) of \d+(?:[^\n]*?\((\d+) FAILED\))?/g;

function runPart(part) {
  return new Promise((resolve) => {
    const started = Date.now();
    let output = '';
    const child = spawn('npm', ['run', '--silent', part.script], { cwd: ROOT, stdio: ['ignore', 'pipe', 'inherit'] });
    child.stdout.on('data', (chunk) => {
      process.stdout.write(chunk);
      output += chunk;
    });
    child.on('close', (status) => {
      const counts = part.counted ? countsOf(output) : { ran: 0, failed: 0 };
      const empty = part.counted && counts.ran === 0;
      resolve({ ...part, ...counts, ok: status === 0 && !empty, empty, seconds: (Date.now() - started) / 1000 });
    });
  });
}

function countsOf(output) {
  const jasmine = JASMINE.exec(output);
  if (jasmine) return { ran: Number(jasmine[1]), failed: Number(jasmine[2]) };
  const last = [...output.matchAll(KARMA)].at(-1);
  return last ? { ran: Number(last[1]), failed: Number(last[2] ?? 0) } : { ran: 0, failed: 0 };
}

ensureInstalled();
process.env.CHROME_BIN = findChromium();

const results = [];
for (const part of PARTS) {
  console.log(`\n── ${part.name} ──`);
  results.push(await runPart(part));
}

console.log('\n── summary ──');
for (const { name, ok, empty, counted, ran, failed, seconds } of results) {
  const counts = counted ? ` · ${ran} run, ${failed} failed` : '';
  console.log(`${ok ? 'ok  ' : 'FAIL'} ${name}${counts}${empty ? ' · nothing ran' : ''} · ${seconds.toFixed(1)} s`);
}
const ran = results.reduce((sum, { ran }) => sum + ran, 0);
const failures = results.reduce((sum, { failed }) => sum + failed, 0);
// A part that fails as a whole (types, lint, a crash) counts as one failure.
const broken = results.filter(({ ok, failed }) => !ok && failed === 0).length;
console.log(`\n${ran - failures} passed, ${failures + broken} failed`);
process.exitCode = results.every(({ ok }) => ok) ? 0 : 1;
