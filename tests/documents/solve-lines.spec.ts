import { type ChildProcess, spawn } from 'node:child_process';
import { closeSync, openSync } from 'node:fs';
import { join } from 'node:path';
import type { Readable } from 'node:stream';
import { solve } from '../../shared/solve';
import { bendUp, partOf } from '../support/plain-part';

const ROOT = join(__dirname, '..', '..');
const ANGLE = partOf([{ leg: 6 }, bendUp(90, 0.125), { leg: 8 }]);
const BROKEN = partOf([{ leg: -1 }]);

interface Run {
  readonly status: number | null;
  readonly lines: readonly string[];
  readonly complaint: string;
}

const COMMAND = ['--import', 'tsx', join(ROOT, 'api/cli/solve.ts')];

/** Feeds the command line with `input`, in pieces as they may come through a pipe. */
function run(input: readonly string[], args: readonly string[] = []): Promise<Run> {
  const child = spawn(process.execPath, [...COMMAND, ...args], { cwd: ROOT });
  for (const piece of input) child.stdin.write(piece);
  child.stdin.end();
  return outcomeOf(child.stdout, child.stderr, child);
}

function outcomeOf(stdout: Readable, stderr: Readable, child: ChildProcess): Promise<Run> {
  const out: Buffer[] = [];
  const complaints: Buffer[] = [];
  stdout.on('data', (chunk: Buffer) => out.push(chunk));
  stderr.on('data', (chunk: Buffer) => complaints.push(chunk));
  return new Promise((resolve, reject) => {
    child.on('error', reject);
    child.on('close', (status) => {
      const text = Buffer.concat(out).toString('utf8');
      resolve({ status, lines: text.split('\n').slice(0, -1), complaint: Buffer.concat(complaints).toString('utf8') });
    });
  });
}

const okOf = (lines: readonly string[]): boolean[] => lines.map((line) => (JSON.parse(line) as { ok: boolean }).ok);

/** Milliseconds: each case starts a Node of its own, on machines of any speed. */
const PATIENCE = 60_000;

describe('Part documents on standard input', () => {
  it(
    'one a line give one result a line, in order, to the last digit',
    async () => {
      const strip = partOf([{ leg: 1 }]);
      const { status, lines } = await run([`${JSON.stringify(ANGLE)}\n\n${JSON.stringify(strip)}\n`]);
      expect(status).toBe(0);
      expect(lines.map((line) => JSON.parse(line) as unknown)).toEqual(
        [ANGLE, strip].map((document) => JSON.parse(JSON.stringify(solve(document))) as unknown),
      );
    },
    PATIENCE,
  );

  it(
    'that are broken give a result on their own line, and the run goes on with status 1',
    async () => {
      const input = [
        JSON.stringify(ANGLE),
        '{ garbage',
        JSON.stringify(BROKEN),
        '5',
        JSON.stringify({ document: ANGLE }),
      ];
      const { status, lines } = await run([input.join('\r\n')]);
      expect(status).toBe(1);
      expect(okOf(lines)).toEqual([true, false, false, false, true]);
      expect(lines[1]).toContain('This is not JSON');
      expect(lines[2]).toContain('chain/0/leg');
    },
    PATIENCE,
  );

  it(
    'may begin with a line of garbage',
    async () => {
      const { status, lines } = await run([`garbage\n${JSON.stringify(ANGLE)}\n`]);
      expect(status).toBe(1);
      expect(okOf(lines)).toEqual([false, true]);
    },
    PATIENCE,
  );

  it(
    'may be one document printed over many lines, with blank ones, cut anywhere',
    async () => {
      const text = `\n\n${JSON.stringify({ document: ANGLE, shop: {} }, null, 2).replace('"chain"', '\n"chain"')}\n\n`;
      const { status, lines } = await run([text.slice(0, 40), text.slice(40, 41), text.slice(41)]);
      expect(status).toBe(0);
      expect(okOf(lines)).toEqual([true]);
    },
    PATIENCE,
  );

  it(
    'may be none at all',
    async () => {
      const { status, lines } = await run(['\n \n']);
      expect([status, lines.length]).toEqual([0, 0]);
    },
    PATIENCE,
  );

  it(
    'that can not be read give status 2 and no result',
    async () => {
      const directory = openSync(ROOT, 'r');
      const child = spawn(process.execPath, COMMAND, { cwd: ROOT, stdio: [directory, 'pipe', 'pipe'] });
      const { status, lines, complaint } = await outcomeOf(child.stdout!, child.stderr!, child);
      closeSync(directory);
      expect([status, lines.length]).toEqual([2, 0]);
      expect(complaint).toContain('Standard input could not be read');
    },
    PATIENCE,
  );

  it(
    'are explained by --help',
    async () => {
      const { status, lines } = await run([], ['--help']);
      expect(status).toBe(0);
      expect(lines.join('\n')).toContain('one JSON document a line');
      expect(lines.join('\n')).toContain('exit');
    },
    PATIENCE,
  );
});
