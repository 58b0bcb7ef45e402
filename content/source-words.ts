import { FACT_SOURCES, SOURCES } from './sources';

const UNDATED = 'n.d.';

function wordsOf(id: string): string {
  const source = SOURCES[id];
  if (!source) return id;
  const { title, author, year } = source;
  const made = [author, year === UNDATED ? 'undated' : year].filter(Boolean).join(', ');
  return `${title} (${made})`;
}

/**
 * What stands behind a statement, for people: title, author, year, each source once.
 * @param ids as the knowledge cites them: facts, cases and sources, or `common practice`
 */
export function sourceWords(ids: readonly string[]): string[] {
  const sources = new Set(ids.flatMap((id) => FACT_SOURCES[id] ?? [id]));
  const isPractice = sources.delete('common practice');
  const named = [...sources].map(wordsOf).sort((a, b) => a.localeCompare(b));
  return isPractice || named.length === 0 ? [...named, 'common practice, no source'] : named;
}
