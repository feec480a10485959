/** A small seeded generator (mulberry32): the same request always draws the same points. */
export class Random {
  constructor(private state: number) {}

  /** Uniform 32-bit unsigned integer. */
  next(): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let t = Math.imul(this.state ^ (this.state >>> 15), 1 | this.state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return (t ^ (t >>> 14)) >>> 0;
  }

  /** Uniform in [0, 1). */
  unit(): number {
    return this.next() / 4294967296;
  }

  /** Uniform integer in [0, n). */
  below(n: number): number {
    return Math.floor(this.unit() * n);
  }
}

/** Seed of a request: FNV-1a over its texts. */
export function seedOf(...texts: readonly string[]): number {
  let hash = 0x811c9dc5;
  for (const text of texts) {
    for (let k = 0; k < text.length; k++) hash = Math.imul(hash ^ text.charCodeAt(k), 0x01000193);
    hash = Math.imul(hash ^ 0x1f, 0x01000193);
  }
  return hash | 0;
}
