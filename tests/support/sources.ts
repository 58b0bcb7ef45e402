import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
const OURS = ['app', 'components', 'content', 'db', 'diagnosis', 'lib', 'scripts', 'tests'];
const SINGLE = [
  'instrumentation.ts',
  'proxy.ts',
  'next.config.ts',
  'vitest.config.ts',
  'playwright.config.ts',
];
const CODE = /\.(ts|tsx|mts|mjs)$/;

export interface Source {
  /** From the root of the project, with forward slashes. */
  path: string;
  text: string;
}

function* walk(folder: string): Generator<string> {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* walk(path);
    else yield path;
  }
}

const existing = (folder: string): string[] => {
  try {
    return [...walk(join(ROOT, folder))];
  } catch {
    return [];
  }
};

/** Every code file of ours, read once. */
export const SOURCES: readonly Source[] = [
  ...OURS.flatMap(existing),
  ...SINGLE.map((name) => join(ROOT, name)),
]
  .filter((path) => CODE.test(path))
  .map((path) => ({ path: relative(ROOT, path).replaceAll('\\', '/'), text: readFileSync(path, 'utf8') }));

export const below = (...folders: string[]): Source[] =>
  SOURCES.filter(({ path }) => folders.some((folder) => path.startsWith(`${folder}/`)));

/** What a file imports at run time, as paths from the root for what is ours; types are left out, for they are gone then. */
export function importsOf({ path, text }: Source): string[] {
  const found = text.matchAll(/(?:^|\n)\s*(?:import|export)\s+(?!type\b)[^;]*?from\s+'([^']+)'|import\(\s*'([^']+)'\s*\)|(?:^|\n)import\s+'([^']+)'/g); // prettier-ignore
  return [...found].map(([, from, dynamic, bare]) => resolved(path, from ?? dynamic ?? bare ?? ''));
}

function resolved(from: string, to: string): string {
  if (to.startsWith('@/')) return to.slice(2);
  if (!to.startsWith('.')) return to;
  return new URL(to, `file:///${from}`).pathname.slice(1);
}
