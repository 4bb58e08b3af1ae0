import { dictionary } from '@zxcvbn-ts/language-common';

/** Passwords that were found in breaches. */
const BREACHED = new Set(dictionary.passwords);

const PRODUCT = 'ringtrue';
const SHORTEST_OWN_WORD = 4;
const LEAST_BESIDE_OWN_WORDS = 8;
const LONGEST_REPEATED = 8;

/**
 * Why a password of fitting length is too easily guessed; null when it is not.
 *
 * @param own - names and addresses of the person and the shop
 */
export function weaknessOf(password: string, own: readonly string[]): string | null {
  const plain = fold(password);
  if (isOneOrTwoBreached(plain))
    return 'This is one of the passwords tried first. Four words of your own make a better one.';
  if (repeatsItself(plain)) return 'This repeats itself. Four words of your own make a better one.';
  const words = wordsOf([PRODUCT, ...own]);
  const rest = withoutWords(plain, words);
  const hasOwnWord = words.some((word) => plain.includes(word));
  if (hasOwnWord && (rest.length < LEAST_BESIDE_OWN_WORDS || BREACHED.has(rest)))
    return 'This is mostly your own or the shop’s name. Four other words make a better one.';
  return null;
}

const fold = (text: string) => text.normalize('NFKC').toLowerCase();

function isOneOrTwoBreached(password: string): boolean {
  if (BREACHED.has(password)) return true;
  return [...password].some(
    (_, at) => BREACHED.has(password.slice(0, at)) && BREACHED.has(password.slice(at).trim()),
  );
}

function repeatsItself(password: string): boolean {
  return Array.from({ length: LONGEST_REPEATED }, (_, index) => index + 1).some((period) =>
    [...password].every((character, at, all) => character === all[at % period]),
  );
}

const wordsOf = (names: readonly string[]) =>
  names
    .flatMap((name) => fold(name).split(/[^\p{L}\p{N}]+/u))
    .filter((word) => word.length >= SHORTEST_OWN_WORD)
    .sort((a, b) => b.length - a.length);

const withoutWords = (password: string, words: readonly string[]) =>
  words.reduce((rest, word) => rest.replaceAll(word, ''), password).replace(/[^\p{L}\p{N}]/gu, '');
