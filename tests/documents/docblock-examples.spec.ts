import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';

const SHARED = join(__dirname, '..', '..', 'shared');

interface Example {
  readonly file: string;
  readonly call: string;
  readonly expected: string;
}

/** Every `@example call // value` line in the docblocks of the engine. */
function examples(): Example[] {
  const files = readdirSync(SHARED, { recursive: true, encoding: 'utf8' }).filter(
    (name) => name.endsWith('.ts') && !name.endsWith('.spec.ts'),
  );
  return files.flatMap((name) => {
    const text = readFileSync(join(SHARED, name), 'utf8');
    return [...text.matchAll(/@example (.+?) \/\/ (.+?)(?: \*\/)?$/gm)].map(([, call, expected]) => ({
      file: join(SHARED, name),
      call: call!,
      expected: expected!.trim(),
    }));
  });
}

/** Runs a call with the exports of its own file in sight. */
function valueOf({ file, call }: Example): unknown {
  // eslint-disable-next-line @typescript-eslint/no-require-imports
  const exported = require(file) as Record<string, unknown>;
  const names = Object.keys(exported).filter((name) => call.includes(name));
  return new Function(...names, `return (${call});`)(...names.map((name) => exported[name])) as unknown;
}

/** Written as the docblocks write: text in single quotes, figures with … for "and so on", rounded to 12 digits. */
function written(value: unknown): string {
  if (typeof value === 'string') return `'${value}'`;
  if (typeof value === 'number') return String(Number(value.toPrecision(12)));
  if (Array.isArray(value)) return `[${value.map(written).join(', ')}]`;
  if (typeof value !== 'object' || value === null) return String(value);
  return `{ ${Object.entries(value)
    .map(([key, inner]) => `${key}: ${written(inner)}`)
    .join(', ')} }`;
}

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

describe('The examples in the docblocks of the engine', () => {
  /** Needs more than its own file's exports (pieces of a layout), or gives figures "to four places". */
  const inWords = (example: Example): boolean => / to \w+ places|flat blank/.test(example.expected);

  const all = examples();
  it('are there', () => {
    expect(all.length).toBeGreaterThan(25);
  });

  for (const example of all.filter((candidate) => !inWords(candidate))) {
    it(`${relative(SHARED, example.file)}: ${example.call}`, () => {
      const pattern = example.expected.split('…').map(escaped).join('\\d*');
      expect(written(valueOf(example))).toMatch(new RegExp(`^${pattern}$`));
    });
  }
});
