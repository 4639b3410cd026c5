import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { basename, dirname, join, relative, resolve } from 'node:path';
import { expect, test } from 'vitest';

const root = resolve(import.meta.dirname, '..');
const files = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
  cwd: root,
  encoding: 'utf8',
})
  .split('\n')
  .filter((file) => file !== '' && existsSync(join(root, file)));
const sources = files.filter((file) => /\.(ts|tsx|js)$/.test(file));

/** What a layer may import besides itself. */
const allowed: Record<string, string[]> = {
  core: ['core'],
  db: ['db', 'core'],
  api: ['api', 'db', 'core'],
  web: ['web', 'core'],
  test: ['test', 'web', 'api', 'db', 'core'],
};
/** Packages of the core: schemas, hashing, shapes; nothing that knows a server or a page. */
const corePackages = ['zod', '@noble/hashes', 'd3-contour', 'd3-scale', 'd3-scale-chromatic'];

type Import = { from: string; to: string; typeOnly: boolean };

function importsOf(file: string): Import[] {
  const text = readFileSync(join(root, file), 'utf8');
  const found = text.matchAll(/(?:import|export)\s+(type\s)?[^'";]*?from\s*'([^']+)'|import\s*\(?\s*'([^']+)'/g);
  return [...found].map(([, type, named, bare]) => ({ from: file, to: named ?? bare!, typeOnly: Boolean(type) }));
}

function target({ from, to }: Import): string | null {
  if (to.startsWith('#')) return to.slice(1);
  if (to.startsWith('.')) return relative(root, resolve(root, dirname(from), to));
  return null;
}

const imports = sources.flatMap(importsOf);
const layerOf = (file: string) => file.split('/')[0]!;

test('layers – every import – points downwards', () => {
  const wrong = imports.filter((one) => {
    const to = target(one);
    const layers = allowed[layerOf(one.from)];
    return to !== null && layers && to.includes('/') && !layers.includes(layerOf(to));
  });
  expect(wrong).toEqual([]);
});

test('core – packages – are schemas, hashing and shapes only', () => {
  const packages = imports
    .filter((one) => layerOf(one.from) === 'core' && target(one) === null)
    .filter(({ to }) => !corePackages.some((name) => to === name || to.startsWith(`${name}/`)));
  expect(packages).toEqual([]);
});

test('files – imports that run – form no circle', () => {
  const next = new Map<string, string[]>();
  for (const one of imports) {
    const to = target(one);
    if (to && !one.typeOnly) next.set(one.from, [...(next.get(one.from) ?? []), to]);
  }
  const done = new Set<string>();
  const circles: string[] = [];
  const visit = (file: string, path: string[]) => {
    if (path.includes(file)) circles.push([...path.slice(path.indexOf(file)), file].join(' → '));
    if (done.has(file) || path.includes(file)) return;
    for (const other of next.get(file) ?? []) visit(other, [...path, file]);
    done.add(file);
  };
  for (const file of sources) visit(file, []);
  expect(circles).toEqual([]);
});

test('names – folders and files – speak of the domain', () => {
  expect(files.filter((file) => /(^|\/)(utils?|helpers?|common|misc|lib)(\/|\.[jt]sx?$)/.test(file))).toEqual([]);
  expect(sources.filter((file) => /^index\.(ts|tsx|js)$/.test(basename(file)))).toEqual([]);
  expect(sources.map((file) => basename(file)).filter((name) => !/^[a-z0-9._-]+$/.test(name))).toEqual([]);
});

test('source files – length – stays readable', () => {
  const long = sources.filter((file) => readFileSync(join(root, file), 'utf8').split('\n').length > 301);
  expect(long).toEqual([]);
});

test('top level – folders – are the five of the map', () => {
  const folders = new Set(files.filter((file) => file.includes('/')).map((file) => file.split('/')[0]));
  expect(folders).toEqual(new Set(['.ci', 'api', 'core', 'db', 'test', 'web']));
});

test('tracked text – machine paths and registry hosts – are absent', () => {
  const home = ['/wo', 'rk/'].join('');
  const texts = files.filter((file) => /\.(ts|tsx|js|json|md|css|html|sql)$|Makefile$|^\.ci\//.test(file));
  const wrong = texts.filter((file) => {
    const text = readFileSync(join(root, file), 'utf8');
    return text.includes(home) || (file !== 'package-lock.json' && /registry\.npmjs|deb\.debian/.test(text));
  });
  expect(wrong).toEqual([]);
});
