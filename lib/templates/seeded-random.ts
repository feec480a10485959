/**
 * A small random generator that gives the same numbers for the same seed for ever: a draw is stored as its seed, and
 * has to come out again years later and on any machine. Changing any constant here changes every student's numbers.
 */
export interface SeededRandom {
  /** A whole number from 0 to `bound` − 1, each equally likely; `bound` is a whole number from 1 to 2^32. */
  below(bound: number): number;
}

/**
 * Starts a generator from a text. The text is hashed to 64 bits with FNV-1a over its UTF-16 code units, two bytes each,
 * low byte first (Fowler, Noll, Vo; RFC 9923); SplitMix64 spreads that over the state (Steele, Lea and Flood 2014);
 * xoshiro128** makes the numbers (Blackman and Vigna 2021).
 */
export function seededRandom(seed: string): SeededRandom {
  const state = stateFrom(seed);
  return {
    below(bound) {
      if (!Number.isInteger(bound) || bound < 1 || bound > WORDS) throw new RangeError('A bound is from 1 to 2^32.');
      // Numbers past the last whole multiple of the bound are thrown away, so that none is likelier than another.
      const limit = WORDS - (WORDS % bound);
      for (;;) {
        const word = nextWord(state);
        if (word < limit) return word % bound;
      }
    },
  };
}

const WORDS = 2 ** 32;
const MASK_64 = (1n << 64n) - 1n;
const FNV_OFFSET = 0xcbf29ce484222325n;
const FNV_PRIME = 0x100000001b3n;

export type XoshiroState = [number, number, number, number];

function stateFrom(seed: string): XoshiroState {
  let hash = FNV_OFFSET;
  for (let index = 0; index < seed.length; index += 1) {
    const unit = seed.charCodeAt(index);
    hash = ((hash ^ BigInt(unit & 0xff)) * FNV_PRIME) & MASK_64;
    hash = ((hash ^ BigInt(unit >>> 8)) * FNV_PRIME) & MASK_64;
  }
  const first = splitMix64(hash);
  const second = splitMix64(first.counter);
  const word = (value: bigint) => Number(value & 0xffffffffn);
  const state: XoshiroState = [
    word(first.output),
    word(first.output >> 32n),
    word(second.output),
    word(second.output >> 32n),
  ];
  // The state of all zeros is the one from which the generator never moves.
  return state.every((part) => part === 0) ? [1, 0, 0, 0] : state;
}

/** One step of SplitMix64 from a 64-bit counter: the next counter and the number it gives. */
export function splitMix64(before: bigint): { counter: bigint; output: bigint } {
  const counter = (before + 0x9e3779b97f4a7c15n) & MASK_64;
  let mixed = ((counter ^ (counter >> 30n)) * 0xbf58476d1ce4e5b9n) & MASK_64;
  mixed = ((mixed ^ (mixed >> 27n)) * 0x94d049bb133111ebn) & MASK_64;
  return { counter, output: mixed ^ (mixed >> 31n) };
}

/** One step of xoshiro128**, version 1.1: a whole number from 0 to 2^32 − 1; the state moves on. */
export function nextWord(state: XoshiroState): number {
  const result = Math.imul(rotateLeft(Math.imul(state[1], 5), 7), 9) >>> 0;
  const shifted = state[1] << 9;
  state[2] ^= state[0];
  state[3] ^= state[1];
  state[1] ^= state[2];
  state[0] ^= state[3];
  state[2] ^= shifted;
  state[3] = rotateLeft(state[3], 11);
  return result;
}

function rotateLeft(word: number, bits: number): number {
  return (word << bits) | (word >>> (32 - bits));
}
