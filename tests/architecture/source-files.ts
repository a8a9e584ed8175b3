import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, normalize, relative } from 'node:path';

export const ROOT = join(__dirname, '..', '..');

/** Every TypeScript file below a folder of the project, as paths from its root. */
export function sourceFiles(folder: string): string[] {
  return readdirSync(join(ROOT, folder), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts'))
    .map((file) => join(folder, file))
    .sort();
}

const IMPORT =
  /(?:^|\n)\s*(?:import|export)\b[^'"`;]*?from\s*['"]([^'"]+)['"]|(?:^|\n)\s*import\s*['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)/g;

export interface Import {
  readonly from: string;
  /** Path from the root for the project's own files, else the package's name. */
  readonly to: string;
  readonly own: boolean;
  /** `import type` leaves nothing at run time. */
  readonly typeOnly: boolean;
}

/** What a file imports, own files as paths from the root without ending. */
export function importsOf(file: string): Import[] {
  const text = readFileSync(join(ROOT, file), 'utf8');
  return [...text.matchAll(IMPORT)].map((match) => {
    const target = match[1] ?? match[2] ?? match[3] ?? '';
    const typeOnly = /^\s*(?:import|export)\s+type\b/.test(match[0]);
    if (target.startsWith('.')) {
      return { from: file, to: normalize(join(dirname(file), target)), own: true, typeOnly };
    }
    if (target.startsWith('@shared/')) {
      return { from: file, to: join('shared', relative('@shared', target)), own: true, typeOnly };
    }
    return { from: file, to: target, own: false, typeOnly };
  });
}
