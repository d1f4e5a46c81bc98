const DECIMAL = /^(\d*)[.,](\d+)$/;
const FRACTION = /^(\d{1,3})\/(\d{1,3})$/;
const NUMBER_DRILL = /^(?:#|no\.?|nr\.?)(\d{1,2})$/i;
const RIVET = /^(?:ms)?(?:20)?(470|426)?-?(a|ad|b|d|dd)(\d{1,2})(?:-(\d{1,2}(?:[.,]5)?))?$/i;
const PIECES = /[^\s"“”;:()[\]{}<>|]+/gu;
/** A term longer than this is no word of anybody's. */
const TERM_MAX = 64;
export const SEARCH_TERMS_MAX = 24;

/** What a text is searched by: plain words, and numbers of the trade written as one token each. */
export interface SearchTerms {
  readonly words: readonly string[];
  readonly numbers: readonly string[];
}

/** `0.3870`, `.387` and `0,387` are one number; digits past four places are nobody's measurement. */
function numberToken(whole: string, fraction: string): string {
  return `n${Number(whole || '0')}p${fraction.slice(0, 4).replace(/0+$/, '') || '0'}`;
}

function rivetTokens(match: RegExpMatchArray): string[] {
  const [, family, alloy, dash, length] = match;
  const size = `rivet${alloy!.toLowerCase()}${Number(dash)}`;
  const tokens = [size];
  if (family) tokens.push(`family${family}`);
  if (length) tokens.push(`${size}l${length.replace(/[.,]/, 'p')}`);
  return tokens;
}

/** The tokens of one piece of text, or null when it is no number of the trade. */
function tradeTokens(piece: string): string[] | null {
  const drill = NUMBER_DRILL.exec(piece);
  if (drill) return [`drill${Number(drill[1])}`];
  const rivet = RIVET.exec(piece);
  if (rivet) return rivetTokens(rivet);
  const decimal = DECIMAL.exec(piece);
  if (decimal) return [numberToken(decimal[1]!, decimal[2]!)];
  const fraction = FRACTION.exec(piece);
  return fraction ? [`f${Number(fraction[1])}over${Number(fraction[2])}`] : null;
}

/** `No 30`, `AD 6` and `470 AD4-4.5` are written apart and meant as one. */
function joinWrittenApart(text: string): string {
  return text
    .replace(/\b(no|nr)\.?\s+(\d{1,2})\b/gi, '#$2')
    .replace(/\b(470|426)\s+((?:a|ad|b|d|dd)\d)/gi, '$1$2')
    .replace(/\b(AD|DD)\s+(\d{1,2})\b/g, '$1$2')
    .replace(/(\d)\s*mm\b/gi, '$1');
}

function plainWords(piece: string): string[] {
  return piece
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word.length > 0 && word.length <= TERM_MAX);
}

/**
 * Cuts any text into what it is found by. Never throws; the same function reads what is indexed and what is asked, so
 * that `#30`, `No 30` and `no. 30` meet.
 *
 * @example searchTerms('edge 0.387 AD6') // { words: ['edge'], numbers: ['n0p387', 'rivetad6'] }
 */
export function searchTerms(text: string): SearchTerms {
  const words: string[] = [];
  const numbers: string[] = [];
  for (const [raw] of joinWrittenApart(text).matchAll(PIECES)) {
    const piece = raw.replace(/[.,!?'’]+$/u, '').replace(/^['‘±~≥≤<>=]+/u, '');
    const tokens = piece.length <= TERM_MAX ? tradeTokens(piece) : null;
    if (tokens) numbers.push(...tokens);
    else words.push(...plainWords(piece));
  }
  return { words, numbers };
}

/**
 * The full-text query for what somebody typed; null when nothing in it can be searched. Every term is quoted, so
 * nothing typed is read as an operator; the last word may be the beginning of one. With `any` one term is enough, for
 * when nothing holds them all.
 */
export function searchQuery(text: string, terms: 'all' | 'any' = 'all'): string | null {
  const { words, numbers } = searchTerms(text);
  const wanted = [...words, ...numbers].slice(0, SEARCH_TERMS_MAX);
  if (wanted.length === 0) return null;
  const lastWord = words.at(-1);
  const quoted = wanted.map((term) => (term === lastWord && term.length > 1 ? `"${term}"*` : `"${term}"`));
  return quoted.join(terms === 'all' ? ' AND ' : ' OR ');
}
