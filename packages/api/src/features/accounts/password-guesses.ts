import { dictionary } from '@zxcvbn-ts/language-common';

const COMMON = new Set<string>(dictionary['passwords-common'] as string[]);
/** Words that whoever guesses at this product's accounts tries first. */
const PRODUCT_WORDS = [
  'rivetside',
  'rivet',
  'builder',
  'mentor',
  'chapter',
  'steward',
  'workshop',
  'hangar',
  'aircraft',
  'airplane',
  'aeroplane',
];
const WORD_MIN = 4;
/** What must stand beside words that are known to everybody. */
const OWN_SIGNS_MIN = 6;
/** A common word with fewer signs about it than this is still that word. */
const TRIMMINGS_MAX = 8;
const RUNS = ['qwertyuiopasdfghjklzxcvbnm', 'qwertzuiopasdfghjklyxcvbnm', 'azertyuiopqsdfghjklmwxcvbn'];
const LOOKS_LIKE: Readonly<Record<string, string>> = {
  '@': 'a',
  '4': 'a',
  '3': 'e',
  '1': 'i',
  '!': 'i',
  '0': 'o',
  $: 's',
  '5': 's',
  '7': 't',
};

/** Is it among the first that are guessed? `about` is what is known of its owner: name and address. */
export function isGuessable(password: string, about: readonly string[]): boolean {
  const lower = password.toLowerCase();
  return (
    COMMON.has(lower) ||
    isCommonWithTrimmings(lower) ||
    isOneThingRepeated(lower) ||
    isRun(lower) ||
    hasLittleBeside(lower, [...PRODUCT_WORDS, ...about.flatMap(wordsOf)])
  );
}

/** `Password2024!!`, `p4ssw0rd1234` */
function isCommonWithTrimmings(lower: string): boolean {
  const bare = lower.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '');
  if (bare.length < WORD_MIN || lower.length - bare.length > TRIMMINGS_MAX) return false;
  return COMMON.has(bare) || COMMON.has([...bare].map((sign) => LOOKS_LIKE[sign] ?? sign).join(''));
}

/** `aaaaaaaaaaaa`, `abcabcabcabc`, `passwordpassword` */
function isOneThingRepeated(lower: string): boolean {
  const unit = /^(.+?)\1+$/s.exec(lower)?.[1];
  return unit !== undefined && (unit.length <= WORD_MIN || COMMON.has(unit));
}

/** `123456789012`, `abcdefghijkl`, `qwertyuiopas`, and back again */
function isRun(lower: string): boolean {
  const back = [...lower].reverse().join('');
  if (RUNS.some((run) => run.includes(lower) || run.includes(back))) return true;
  const codes = [...lower].map((sign) => sign.codePointAt(0)!);
  const steps = codes.slice(1).map((code, at) => code - codes[at]!);
  // From 9 on to 0, and back.
  return steps.every((step) => step === 1 || step === -9) || steps.every((step) => step === -1 || step === 9);
}

function hasLittleBeside(lower: string, words: readonly string[]): boolean {
  const longestFirst = [...words].sort((a, b) => b.length - a.length);
  const own = longestFirst.reduce((left, word) => left.replaceAll(word, ''), lower);
  return own.length < lower.length && own.length < OWN_SIGNS_MIN;
}

function wordsOf(text: string): string[] {
  return text
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word.length >= WORD_MIN);
}
