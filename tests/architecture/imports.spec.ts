import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { type Import, importsOf, ROOT, sourceFiles } from './source-files';

const room = (path: string): string => path.split('/')[0]!;

/** The engine's folders, each of which may import those before it. */
const ORDER = [
  'units',
  'geometry',
  'reference',
  'part',
  'allowance',
  'springback',
  'layout',
  'formed',
  'section',
  'shop',
  'checks',
];

describe('import directions', () => {
  const shared = sourceFiles('shared').flatMap(importsOf);
  const api = sourceFiles('api').flatMap(importsOf);
  const src = sourceFiles('src').flatMap(importsOf);

  const offenders = (imports: Import[], allowed: string[]): string[] =>
    imports.filter(({ own, to }) => own && !allowed.includes(room(to))).map(({ from, to }) => `${from} imports ${to}`);

  it('keep the browser and the server apart: src → shared ← api', () => {
    const isSpec = ({ from }: Import): boolean => from.endsWith('.spec.ts');
    expect(
      offenders(
        shared.filter((each) => !isSpec(each)),
        ['shared'],
      ),
    ).toEqual([]);
    // The engine's specs share the cases that the laws are tried on.
    expect(offenders(shared.filter(isSpec), ['shared', 'tests'])).toEqual([]);
    expect(offenders(api, ['api', 'shared'])).toEqual([]);
    expect(offenders(src, ['src', 'shared'])).toEqual([]);
  });

  it('keep Node, the DOM and frameworks out of the engine', () => {
    const engine = shared.filter(({ from, own }) => !own && !from.endsWith('.spec.ts'));
    expect([...new Set(engine.map(({ to }) => to))].sort()).toEqual(['mathjs/number', 'zod']);
  });

  it('let each folder of the engine use only those before it (types aside)', () => {
    const folder = (path: string): string => path.split('/')[1]!;
    const wrong = shared
      .filter(({ from, own, typeOnly }) => own && !typeOnly && !from.endsWith('.spec.ts'))
      .map(({ from, to }) => ({ from, to, rank: [ORDER.indexOf(folder(from)), ORDER.indexOf(folder(to))] }))
      .filter(({ rank: [from, to] }) => from! >= 0 && to! > from!)
      .map(({ from, to }) => `${from} imports ${to}`);
    expect(wrong).toEqual([]);
  });

  it('have no circles at run time', () => {
    expect(circlesOf([...shared, ...api, ...src])).toEqual([]);
  });

  it('have no circles between the folders of the API either (types aside)', () => {
    const folder = (path: string): string => path.split('/').slice(0, 2).join('/');
    const between = api
      .filter(({ from, own, to }) => own && room(to) === 'api' && !from.endsWith('.spec.ts'))
      .map((each) => ({ ...each, from: folder(each.from), to: folder(each.to) }))
      .filter(({ from, to }) => from !== to);
    expect(circlesOf(between)).toEqual([]);
  });
});

function circlesOf(imports: Import[]): string[] {
  const graph = new Map<string, string[]>();
  for (const { from, to, own, typeOnly } of imports) {
    if (!own || typeOnly) continue;
    const target = [`${to}.ts`, to].find((file) => existsSync(join(ROOT, file)));
    if (target !== undefined) graph.set(from, [...(graph.get(from) ?? []), target]);
  }
  const done = new Set<string>();
  const circles: string[] = [];
  const visit = (file: string, path: string[]): void => {
    if (path.includes(file)) circles.push([...path.slice(path.indexOf(file)), file].join(' → '));
    if (done.has(file) || path.includes(file)) return;
    for (const next of graph.get(file) ?? []) visit(next, [...path, file]);
    done.add(file);
  };
  for (const file of graph.keys()) visit(file, []);
  return circles;
}
