// A fingerprint of numbers by their bits: FNV-1a (Fowler, Noll & Vo 1991) on the two 32-bit halves of each double.

const double = new Float64Array(1);
const halves = new Uint32Array(double.buffer);

/** Takes in values one by one; `text` is the fingerprint so far. */
export class Fingerprint {
  #hash = 0x811c9dc5;

  #mix(word: number): void {
    for (let shift = 0; shift < 32; shift += 8) {
      this.#hash = Math.imul(this.#hash ^ ((word >>> shift) & 255), 0x01000193);
    }
  }

  /** The sign of NaN is left to the engine, so all of them count as one. */
  number(value: number): void {
    double[0] = Number.isNaN(value) ? Number.NaN : value;
    if (Number.isNaN(value)) halves.set([0, 0x7ff80000]);
    this.#mix(halves[0] as number);
    this.#mix(halves[1] as number);
  }

  word(value: string): void {
    for (let i = 0; i < value.length; i++) this.#mix(value.charCodeAt(i));
  }

  /** A whole result: every number, text, name and list in it, in order. */
  result(value: unknown): void {
    if (typeof value === "number") this.number(value);
    else if (typeof value === "object" && value !== null) {
      const entries = Object.entries(value);
      this.number(entries.length);
      for (const [name, entry] of entries) {
        this.word(name);
        this.result(entry);
      }
    } else this.word(String(value));
  }

  get text(): string {
    return (this.#hash >>> 0).toString(16).padStart(8, "0");
  }
}
