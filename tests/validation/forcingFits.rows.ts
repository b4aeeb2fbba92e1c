// Every published fit of a forcing at mixes of gases where all of its terms weigh, so that no coefficient can be wrong.
import * as door from "../../src/index.ts";
import fits from "../reference/computed/forcing_fits.json" with { type: "json" };
import { type Check, ROUNDED, ROUNDING } from "./check.ts";
import { AR6_FORCING, ETMINAN, MYHRE, type Source } from "./sources.ts";

type Mix = (typeof fits.rows)[number];
type Gas = keyof Mix["ar6"];
interface Fit {
  readonly key: "myhre" | "etminan" | "meinshausen" | "ar6";
  readonly lawEndsWith: string;
  readonly source: Source;
}

const FITS: readonly Fit[] = [
  { key: "myhre", lawEndsWith: "AdjustedForcingMyhre", source: MYHRE },
  { key: "etminan", lawEndsWith: "AdjustedForcingEtminan", source: ETMINAN },
  { key: "meinshausen", lawEndsWith: "AdjustedForcingMeinshausen", source: AR6_FORCING },
  { key: "ar6", lawEndsWith: "EffectiveForcingAr6", source: AR6_FORCING },
];
const GASES: Readonly<Record<Gas, { column: "C" | "M" | "N"; formula: string }>> = {
  co2: { column: "C", formula: "CO₂" },
  ch4: { column: "M", formula: "CH₄" },
  n2o: { column: "N", formula: "N₂O" },
};
const exported: ReadonlyMap<string, unknown> = new Map(Object.entries(door));
const UNITS = { C: 1e6, M: 1e9, N: 1e9 } as const;

/** Whatever a forcing law may ask for, in a mix before and after; each takes the ports that it has. */
function forcing(name: string, gas: Gas, mix: Pick<Mix, "C" | "M" | "N">): number {
  const pair = (of: "C" | "M" | "N") => mix[of].map((x) => x / UNITS[of]) as [number, number];
  const [C, M, N] = [pair("C"), pair("M"), pair("N")];
  const mean = ([a, b]: readonly [number, number]) => (a + b) / 2;
  const [reference, concentration] = { C, M, N }[GASES[gas].column];
  const all: Readonly<Record<string, number>> = {
    ...{ reference, concentration, co2: C[1], methane: M[1], nitrousOxide: N[1] },
    ...{ methaneReference: M[0], nitrousOxideReference: N[0] },
    ...{ meanCo2: mean(C), meanMethane: mean(M), meanNitrousOxide: mean(N) },
  };
  const law = exported.get(name) as typeof door.co2EffectiveForcingAr6;
  const ports = Object.keys(law.card.inputs).map((port) => [port, all[port]]);
  return law(Object.fromEntries(ports));
}

const row = (
  { key, lawEndsWith, source }: Fit,
  gas: Gas,
  mix: Pick<Mix, "C" | "M" | "N">,
  published: string,
): Check => {
  const { column, formula } = GASES[gas];
  const [from, to] = mix[column] as [number, number];
  const kind = key === "ar6" ? "effective" : "adjusted";
  const name = gas + lawEndsWith;
  return {
    covers: [name],
    what: `${kind} forcing of ${formula} from ${from} to ${to} ${column === "C" ? "ppm" : "ppb"}, ${key}`,
    published: Number(published),
    unit: "W m-2",
    ours: () => forcing(name, gas, mix),
    tolerance: 5 * ROUNDING * Math.abs(Number(published)),
    because: `${ROUNDED} of two terms, of which one takes away four fifths of the other at most`,
    source,
    basis: "computed with mpmath (forcing_fits.py)",
  };
};

const { beyond } = fits;

export const forcingFitRows: readonly Check[] = [
  ...fits.rows.flatMap((mix) =>
    FITS.flatMap((fit) => (Object.keys(GASES) as Gas[]).map((gas) => row(fit, gas, mix, mix[fit.key][gas]))),
  ),
  // above C_max only the logarithm is left
  row(FITS[2] as Fit, "co2", { C: beyond.C, M: [800, 800], N: [beyond.N, beyond.N] }, beyond.co2),
];
