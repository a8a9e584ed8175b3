/** Part documents from standard input, one JSON a line; one result a line on standard output. */
import { fstatSync } from 'node:fs';
import type { SolveResult } from '../../shared/result';
import { solveRequest } from '../../shared/solve-request';

const HELP = `npm run --silent solve < documents.jsonl > results.jsonl

Reads part documents from standard input and prints one JSON result a line, in order.
  input     one JSON document a line, or a single document printed over several lines;
            either a part document, or { "document": …, "shop": … }
  output    {"ok": true, …} with every figure, or {"ok": false, "errors": [{"path", "message"}]}
  exit      0 all were ok · 1 any was not · 2 standard input could not be read
`;

async function main(): Promise<number> {
  if (process.argv.includes('--help')) {
    process.stdout.write(HELP);
    return 0;
  }
  let failed = false;
  const answer = async (text: string): Promise<void> => {
    if (text.trim() === '') return;
    const result = solveText(text);
    failed ||= !result.ok;
    if (!process.stdout.write(`${JSON.stringify(result)}\n`)) {
      await new Promise((resolve) => process.stdout.once('drain', resolve));
    }
  };
  // Once a line is JSON of its own, every line is. If the first is not, it may begin one document printed over several lines.
  let streaming = false;
  const held: string[] = [];
  for await (const line of linesOf(process.stdin)) {
    streaming ||= held.length === 0 && isJson(line);
    if (streaming) await answer(line);
    else if (held.length > 0 || line.trim() !== '') held.push(line);
  }
  const whole = held.join('\n');
  if (isJson(whole)) await answer(whole);
  else for (const line of held) await answer(line);
  return failed ? 1 : 0;
}

async function* linesOf(stream: NodeJS.ReadStream & { readonly fd: number }): AsyncGenerator<string> {
  // Node reads a directory as an empty stream; to whoever gave it, that must not look like "nothing to do".
  if (fstatSync(stream.fd).isDirectory()) throw new Error('it is a directory.');
  stream.setEncoding('utf8');
  let rest = '';
  let begun = false;
  for await (const chunk of stream as AsyncIterable<string>) {
    // Editors on some systems put a byte-order mark first; it is no part of the document.
    const text = begun ? chunk : chunk.replace(/^\uFEFF/, '');
    begun = true;
    const lines = (rest + text).split(/\r?\n/);
    rest = lines.pop() ?? '';
    yield* lines;
  }
  yield rest;
}

function solveText(text: string): SolveResult {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch (error) {
    return { ok: false, errors: [{ path: '', message: `This is not JSON: ${(error as Error).message}` }] };
  }
  return solveRequest(value);
}

function isJson(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  // Whoever reads the results may stop reading (head, a closed pipe); that is no fault of ours.
  process.exit(error.code === 'EPIPE' ? 0 : 2);
});

main().then(
  (status) => {
    process.exitCode = status;
  },
  (error: unknown) => {
    process.stderr.write(`Standard input could not be read: ${(error as Error).message}\n`);
    process.exitCode = 2;
  },
);
