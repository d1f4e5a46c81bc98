import { searchTerms } from './search-terms.js';
import type { Fragment } from './search.schema.js';

const WORD = /[\p{L}\p{N}#][\p{L}\p{N}/.,#-]*[\p{L}\p{N}]|[\p{L}\p{N}]/gu;
const EXCERPT = 160;

interface Span {
  readonly from: number;
  readonly to: number;
}

function hitsIn(text: string, query: string): Span[] {
  const { words, numbers } = searchTerms(query);
  const lastWord = words.at(-1);
  const wanted = new Set([...words, ...numbers]);
  const isWanted = (term: string) =>
    wanted.has(term) || (lastWord !== undefined && lastWord.length > 1 && term.startsWith(lastWord));
  const hits: Span[] = [];
  for (const match of text.matchAll(WORD)) {
    const terms = searchTerms(match[0]);
    if ([...terms.words, ...terms.numbers].some(isWanted))
      hits.push({ from: match.index, to: match.index + match[0].length });
  }
  return hits;
}

/** Cuts a text into what was looked for and what was not. The pieces joined are the text. */
export function fragmentsOf(text: string, query: string): Fragment[] {
  const fragments: Fragment[] = [];
  let at = 0;
  for (const { from, to } of hitsIn(text, query)) {
    if (from > at) fragments.push({ text: text.slice(at, from), hit: false });
    fragments.push({ text: text.slice(from, to), hit: true });
    at = to;
  }
  if (at < text.length) fragments.push({ text: text.slice(at), hit: false });
  return fragments;
}

/** The part of a long text around the first thing found, cut at blanks. */
export function excerptOf(text: string, query: string, length = EXCERPT): Fragment[] {
  const flat = text.replace(/\s+/g, ' ').trim();
  const first = hitsIn(flat, query)[0]?.from ?? 0;
  const begin = first < length / 2 ? 0 : flat.lastIndexOf(' ', first - length / 3) + 1;
  const cut = flat.slice(begin, begin + length);
  const end = begin + length < flat.length ? Math.max(cut.lastIndexOf(' '), length / 2) : cut.length;
  const shown = `${begin > 0 ? '… ' : ''}${cut.slice(0, end)}${begin + end < flat.length ? ' …' : ''}`;
  return fragmentsOf(shown, query);
}
