import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

const root = resolve(import.meta.dirname, '..');
const SOURCE = /\.(tsx?|mjs)$/;

const walk = (folder: string): string[] =>
  readdirSync(join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && SOURCE.test(entry.name))
    .map((entry) => relative(root, join(entry.parentPath, entry.name)))
    .sort();

const isTest = (file: string): boolean => /\.test\.tsx?$/.test(file);

// Static imports and exports, type imports among them, bare imports, dynamic imports and requires.
const SPECIFIER = /(?:\bfrom\s*|\bimport\s*\(?\s*|\brequire\s*\(\s*)(['"`])([@.\w][^'"`\s]*)\1/g;

/** Comments out: words in them are no imports. A `//` inside a string (an address) stays. */
const withoutComments = (text: string): string =>
  text.replaceAll(/\/\*[\s\S]*?\*\//g, '').replaceAll(/(^|[^:'"`])\/\/.*$/gm, '$1');

/** What a file imports: paths from the root for its own code ("lib/plan/draw"), the name for packages ("pdf-lib", "node:fs"). */
function importsOf(file: string): string[] {
  const text = withoutComments(readFileSync(join(root, file), 'utf8'));
  return [...text.matchAll(SPECIFIER)].map(([, , specifier = '']) => {
    if (specifier.startsWith('@/')) return specifier.slice(2);
    if (specifier.startsWith('.')) return relative(root, resolve(root, dirname(file), specifier));
    const [scope = '', name = ''] = specifier.split('/');
    return scope.startsWith('@') ? `${scope}/${name}` : scope;
  });
}

/** A folder and all that its files may import beside their own folder: own code by its path, packages by name. */
interface Layer {
  readonly folder: string;
  readonly own: readonly string[];
  readonly packages?: readonly string[];
  /** Beside this, tests in the folder may import these. */
  readonly tests?: readonly string[];
}

const KERNEL = ['lib/numerics', 'lib/units'];
// Texts are a leaf: whoever says something to a person takes the words from there.
const DOCUMENT = [...KERNEL, 'lib/text', 'lib/geometry', 'lib/airframe'];
const FLAT = [...DOCUMENT, 'lib/parts'];
const PURE_TESTS = ['tests/support', 'tests/fixtures', 'examples'];

const LAYERS: readonly Layer[] = [
  { folder: 'lib/numerics', own: [] },
  { folder: 'lib/units', own: ['lib/numerics'] },
  { folder: 'lib/geometry', own: KERNEL, packages: ['clipper2-ts'] },
  { folder: 'lib/airframe', own: [...KERNEL, 'lib/text', 'lib/geometry'], packages: ['zod'] },
  { folder: 'lib/aero', own: DOCUMENT },
  { folder: 'lib/power', own: DOCUMENT },
  { folder: 'lib/structure', own: DOCUMENT },
  { folder: 'lib/parts', own: DOCUMENT, packages: ['clipper2-ts'] },
  { folder: 'lib/balance', own: FLAT },
  { folder: 'lib/flight', own: [...DOCUMENT, 'lib/aero', 'lib/power'], packages: ['ml-matrix'] },
  { folder: 'lib/linkage', own: DOCUMENT },
  {
    folder: 'lib/figures',
    own: [...FLAT, 'lib/balance', 'lib/aero', 'lib/power', 'lib/structure', 'lib/flight', 'lib/linkage'],
  },
  { folder: 'lib/aids', own: [...FLAT, 'lib/linkage', 'lib/figures'] },
  { folder: 'lib/scale', own: [...FLAT, 'lib/balance', 'lib/figures'] },
  { folder: 'lib/layout', own: FLAT, packages: ['clipper2-ts'] },
  { folder: 'lib/checks', own: [...FLAT, 'lib/balance'] },
  {
    folder: 'lib/plan',
    own: [...FLAT, 'lib/layout', 'lib/figures', 'lib/checks', 'lib/look', 'lib/contract'],
    packages: ['pdf-lib', '@pdf-lib/fontkit', '@svgdotjs/svg.js', '@tarikjabiri/dxf', 'zod'],
  },
  { folder: 'lib/text', own: [] },
  { folder: 'lib/look', own: [], tests: ['lib/parts', 'lib/text'] },
  { folder: 'lib/contract', own: ['lib/numerics', 'lib/airframe', 'lib/figures'], packages: ['zod'] },
  {
    folder: 'workers',
    own: ['lib'],
    packages: ['comlink'],
  },
  {
    folder: 'client',
    own: ['lib', 'workers'],
    packages: ['@tanstack/react-query', 'comlink', 'react', 'zod'],
  },
  {
    folder: 'components',
    own: ['client', 'lib'],
    packages: [
      ...['react', 'react-dom', 'next', 'konva', 'react-konva', 'zustand', '@tanstack/react-query'],
      ...['@svgdotjs/svg.js', 'zod'],
    ],
  },
  {
    folder: 'db',
    own: ['lib'],
    packages: ['drizzle-orm', 'pg', '@electric-sql/pglite'],
  },
  // The demo workshop is laid out through the acts, so that it obeys every rule that a person does.
  { folder: 'db/seed', own: ['db', 'server', 'lib', 'examples'], packages: ['drizzle-orm'] },
  {
    folder: 'server',
    own: ['db', 'lib'],
    packages: ['next', 'react', 'drizzle-orm', 'better-auth', '@better-auth/drizzle-adapter', 'nodemailer', 'zod'],
  },
  {
    folder: 'app',
    own: ['components', 'client', 'server', 'db', 'lib'],
    packages: ['next', 'react', 'react-dom', 'drizzle-orm', 'better-auth', 'zod'],
  },
  { folder: 'scripts/cli', own: ['lib'], packages: ['svgdom', '@svgdotjs/svg.js', '@tarikjabiri/dxf'] },
];

/** Folders that are code for a machine with files, clocks and processes. Everything else gets none of Node's own modules. */
const NODE_FOLDERS = ['db', 'db/seed', 'server', 'scripts/cli'];
const TEST_PACKAGES = ['vitest', 'fast-check'];

const under = (path: string, folder: string): boolean => path === folder || path.startsWith(`${folder}/`);

/** Files of a layer; a folder with a row of its own is no part of the folder around it. */
const filesOf = ({ folder }: Layer): string[] =>
  walk(folder).filter(
    (file) =>
      !LAYERS.some((other) => other.folder !== folder && under(other.folder, folder) && under(file, other.folder)),
  );

function mayImport(layer: Layer, file: string, name: string): boolean {
  const test = isTest(file);
  if (name.startsWith('node:')) return test || NODE_FOLDERS.includes(layer.folder);
  const own = [layer.folder, ...layer.own, ...(test ? [...PURE_TESTS, ...(layer.tests ?? [])] : [])];
  if (own.some((folder) => under(name, folder))) return !LAYERS.some((other) => hides(other, layer, name));
  return [...(layer.packages ?? []), ...(test ? TEST_PACKAGES : [])].includes(name);
}

/** `db` may not reach into `db/seed` just because that lies inside. */
const hides = (inner: Layer, layer: Layer, name: string): boolean =>
  inner.folder !== layer.folder && under(inner.folder, layer.folder) && under(name, inner.folder);

describe('imports run one way', () => {
  it.each(LAYERS.filter(({ folder }) => existsSync(join(root, folder))))('$folder', (layer) => {
    const files = filesOf(layer);
    expect(files.length, `${layer.folder} has files`).toBeGreaterThan(0);
    const wrong = files.flatMap((file) =>
      importsOf(file)
        .filter((name) => !mayImport(layer, file, name))
        .map((name) => `${file}: ${name}`),
    );
    expect(wrong).toEqual([]);
  });

  it('every folder with code has its row', () => {
    const known = LAYERS.map(({ folder }) => folder);
    const tops = ['app', 'client', 'components', 'db', 'lib', 'server', 'workers'];
    const homeless = tops.flatMap(walk).filter((file) => !known.some((folder) => under(file, folder)));
    expect(homeless).toEqual([]);
  });

  it('reads type imports, re-exports, dynamic imports and requires', () => {
    const text = [
      `import type { A } from '@/lib/a';`,
      `export * from '@/lib/b';`,
      `const c = await import('@/lib/c');`,
      `const d = require('d');`,
      `import './e.css';`,
      `// import '@/lib/not';`,
    ].join('\n');
    const found = [...withoutComments(text).matchAll(SPECIFIER)].map((match) => match[2]);
    expect(found).toEqual(['@/lib/a', '@/lib/b', '@/lib/c', 'd', './e.css']);
  });

  it('refuses what the rows do not name', () => {
    const geometry: Layer = { folder: 'lib/geometry', own: ['lib/numerics'] };
    expect(mayImport(geometry, 'lib/geometry/a.ts', 'react-konva')).toBe(false);
    expect(mayImport(geometry, 'lib/geometry/a.ts', 'node:fs')).toBe(false);
    expect(mayImport(geometry, 'lib/geometry/a.ts', 'lib/airframe/defaults')).toBe(false);
    expect(mayImport(geometry, 'lib/geometry/a.ts', 'lib/numerics/vec')).toBe(true);
  });
});

describe('sizes', () => {
  const files = ['app', 'client', 'components', 'db', 'lib', 'server', 'workers', 'scripts', 'tests'].flatMap(walk);
  const linesOf = (file: string): number => readFileSync(join(root, file), 'utf8').split('\n').length;

  it('no file is over 400 lines', () => {
    expect(files.length).toBeGreaterThan(100);
    expect(files.filter((file) => linesOf(file) > 400)).toEqual([]);
  });

  it('a page is under 60 lines', () => {
    const pages = files.filter((file) => file.startsWith('app/') && file.endsWith('/page.tsx'));
    expect(pages.length).toBeGreaterThan(5);
    expect(pages.filter((file) => linesOf(file) > 60)).toEqual([]);
  });
});
