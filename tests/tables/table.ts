// The reference tables as the tests read them. Numbers are strings: inputs are exact decimals or fractions.

/** One set of parameters and its rows. */
export interface ReferenceCase<K extends string> {
  readonly id: string;
  readonly inputs: Readonly<Record<K, string>>;
  /** Temperatures searched, K. */
  readonly within: readonly [number, number];
  /** Of the temperatures. */
  readonly unit?: "K" | "degC";
  readonly rows: readonly ReferenceRow[];
}

/** What a table says of one equilibrium. */
export interface ReferenceState {
  readonly T: string;
  readonly lambda: string;
  readonly stable: boolean;
  /** On a corner of a ramp, where it is neither. */
  readonly onCorner?: boolean;
  /** ∂²N/∂T², W m⁻² K⁻²; absent where N is straight. */
  readonly curvature?: string;
  /** The parts that add up to λ. */
  readonly parts: Readonly<Record<string, string>>;
  /** Each part but the first over minus the first. */
  readonly factors: Readonly<Record<string, string>>;
  readonly dTdS: string;
}

/** All equilibria at one flux; on a continuum `everywhere` stands in place of all else. */
export interface ReferenceRow {
  readonly S: string;
  readonly states: readonly ReferenceState[];
}

/** The nearest double of a decimal or a fraction. */
export function nearest(text: string): number {
  const [above, below] = text.split("/");
  return below === undefined ? Number(above) : Number(above) / Number(below);
}

/** The inputs of a case as numbers. */
export function numbers<K extends string>(inputs: Readonly<Record<K, string>>): Record<K, number> {
  const pairs = Object.entries<string>(inputs).map(([key, text]) => [key, nearest(text)]);
  return Object.fromEntries(pairs) as Record<K, number>;
}

/** A number that must be there. */
export function of(record: Readonly<Record<string, number>>, name: string): number {
  const value = record[name];
  if (value === undefined) throw new Error(`nothing is called ${name}`);
  return value;
}
