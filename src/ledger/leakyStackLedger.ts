// The ledger of leaky layers over a surface: who gives whom how much, and how warm each is.
import { blackbodyFlux } from "../greenhouse/blackbodyFlux.ts";
import {
  EMISSIONS,
  layerEmissions,
  type Streams,
  stackOutgoing,
  stackStreams,
} from "../greenhouse/stackStreams.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import { checkedNumber } from "../ground/range.ts";
import { compensatedSum } from "../ground/sum.ts";
import type { LeakyLayer, LeakyStackLedger, LeakyStackOptions, StackLayerState } from "./leakyStack.ts";
import { type CheckedStack, readLeakyStack } from "./readLeakyStack.ts";
import { layerName, stackFlows } from "./stackFlows.ts";

const PATH = "leakyStackLedger";

/**
 * The ledger of leaky layers without heat capacity over a surface, all in steady state: the reservoirs space, `layer 1` (top)
 * … `layer N`, surface (and interior, if it gives heat), the heat and longwave between neighbours, the longwave up and down
 * at every interface, and the temperature of each, in K. Flows in W m⁻² of the planet's whole area. A layer passes on what
 * it does not absorb, so that its flows are those at the interfaces above and below it.
 *
 * With no surface temperature given, F_0 = OLR is all the heat put in, and the surface comes out; with one, OLR follows as in
 * `leakyStackEmission` and the surface stores the difference. Then F_i = OLR − Q_i, M_0 = OLR,
 * M_i = M_{i−1} + r_i(F_{i−1} + F_i), U = (M + F)/2, D = (M − F)/2, with Q_i the heat put in above interface i by anything
 * but longwave and r = ε/(2 − ε). Emissivities of layers between 0 and 1, of the surface from 1e-9.
 *
 * Throws `missing`, `not-a-number`, `unknown-name`, `unreadable`; `out-of-range`, also for a heated layer of emissivity 0
 * and for one that gives away more than it gets, which have no steady state.
 * Source: two streams through layers that do not scatter; Goody & Yung 1989, Atmospheric Radiation.
 */
export function leakyStackLedger(options: LeakyStackOptions): LeakyStackLedger {
  const stack = readLeakyStack(options, PATH);
  const layers = stack.layers.map(({ emissivity, sunlight, convection }) => ({
    emissivity,
    heating: sunlight + convection,
  }));
  const putIn = compensatedSum([...stack.layers.map((l) => l.sunlight), stack.sunlight, stack.internalFlux]);
  const { temperature, kappa } = stack;
  const outgoing =
    temperature === undefined
      ? putIn
      : stackOutgoing(layers, { emission: blackbodyFlux({ temperature }), kappa });
  const interfaces = stackStreams(layers, outgoing) as Streams<number>[];
  const emissions = layerEmissions(layers, interfaces) as number[];
  return deepFreeze({
    reservoirs: [
      { name: "space", storage: null },
      ...layers.map((_, i) => ({ name: layerName(i), storage: 0 })),
      { name: "surface", storage: putIn - (outgoing as number) },
      ...(stack.internalFlux === 0 ? [] : [{ name: "interior", storage: null }]),
    ],
    flows: stackFlows(stack, interfaces),
    layers: emissions.map((emission, i) => layerState(stack, interfaces, { emission, i })),
    surface: surfaceState(stack, interfaces.at(-1) as Streams<number>),
    interfaces,
  });
}

function surfaceState({ temperature, emissivity, kappa }: CheckedStack, { up, down, net }: Streams<number>) {
  const emission = temperature === undefined ? up + kappa * net : blackbodyFlux({ temperature });
  return {
    name: "surface",
    temperature: temperature ?? temperatureOf(emission, `${PATH}.surface`),
    absorbed: emissivity * down,
    emitted: emissivity * emission,
  };
}

function layerState(
  { layers }: CheckedStack,
  interfaces: readonly Streams<number>[],
  { emission, i }: { readonly emission: number; readonly i: number },
): StackLayerState {
  const { emissivity } = layers[i] as LeakyLayer;
  const temperature = temperatureOf(emission, `${PATH}.layers[${i}]`);
  const falling = (interfaces[i] as Streams<number>).down + (interfaces[i + 1] as Streams<number>).up;
  return {
    name: layerName(i),
    temperature: emissivity === 0 ? null : temperature,
    absorbed: emissivity * falling,
    emitted: 2 * emissivity * emission,
  };
}

/** Of a black body that emits so much; refused where no steady state could. */
function temperatureOf(emission: number, path: string): number {
  checkedNumber(emission, `${path} (σT⁴ in steady state)`, "W m-2", EMISSIONS);
  return Math.sqrt(Math.sqrt(emission / STEFAN_BOLTZMANN));
}
