/**
 * Repeatable random numbers. Ref: Blackman and Vigna, "Scrambled linear pseudorandom number generators", ACM Trans. Math.
 * Softw. 47 (2021), xoshiro128** 1.1, over 32-bit words.
 */
export class RandomSource {
  private spare = 0;
  private hasSpare = false;
  private readonly state: Uint32Array;

  /** Four 32-bit words, not all 0; throws RangeError else. */
  constructor(words: readonly number[]) {
    this.state = Uint32Array.from(words);
    if (words.length !== 4 || this.state.every((word) => word === 0))
      throw new RangeError(`words must be four, not all 0, got ${words.join(', ')}`);
  }

  /** The next 32-bit number, 0 to 2^32 - 1. */
  next(): number {
    const s = this.state;
    const result = Math.imul(rotated(Math.imul(s[1], 5), 7), 9) >>> 0;
    const t = s[1] << 9;
    s[2] ^= s[0];
    s[3] ^= s[1];
    s[1] ^= s[2];
    s[0] ^= s[3];
    s[2] ^= t;
    s[3] = rotated(s[3], 11);
    return result;
  }

  /** Evenly spread over 0 (included) to 1 (excluded). */
  uniform(): number {
    return this.next() / 4294967296;
  }

  /** Normal, mean 0 and standard deviation 1. Ref: Box and Muller (1958), Ann. Math. Stat. 29, 610-611. */
  normal(): number {
    if (this.hasSpare) {
      this.hasSpare = false;
      return this.spare;
    }
    const radius = Math.sqrt(-2 * Math.log(1 - this.uniform()));
    const angle = 2 * Math.PI * this.uniform();
    this.spare = radius * Math.sin(angle);
    this.hasSpare = true;
    return radius * Math.cos(angle);
  }

  /** Between two limits with a most likely value in between (a triangle), the limits included. */
  triangular(low: number, mode: number, high: number): number {
    const width = high - low;
    if (!(width > 0)) return mode;
    const u = this.uniform();
    const turn = (mode - low) / width;
    return u < turn
      ? low + Math.sqrt(u * width * (mode - low))
      : high - Math.sqrt((1 - u) * width * (high - mode));
  }
}

const rotated = (word: number, by: number) => (word << by) | (word >>> (32 - by));

/**
 * A source named by texts (a survey's id, a run, a station): the same names give the same numbers, any other name others.
 * Names are hashed by FNV-1a, 32 bits (Fowler, Noll, Vo), and spread over the four words by the finaliser of MurmurHash3
 * (Appleby, public domain) on a Weyl sequence, as in splitmix.
 */
export function randomSource(...names: readonly string[]): RandomSource {
  let hash = 0x811c9dc5;
  for (const character of names.join('\u0000'))
    hash = Math.imul(hash ^ character.codePointAt(0)!, 0x01000193);
  const words = [1, 2, 3, 4].map((k) => mixed(hash + Math.imul(k, 0x9e3779b9)));
  return new RandomSource(words.some((word) => word !== 0) ? words : [1, 0, 0, 0]);
}

function mixed(word: number): number {
  let h = word | 0;
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
  return (h ^ (h >>> 16)) >>> 0;
}
