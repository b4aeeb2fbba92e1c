// The longwave streams through leaky layers, from the top down: interface 0 is the top, interface N lies on the surface.
//
// At every interface the net stream F = U − D is what leaves the planet less the heat put in above it, and the sum
// M = U + D grows through layer i by r_i(F_{i−1} + F_i) with r = ε/(2 − ε). Everything follows from M_0 = F_0 = OLR.
import { add, div, max, mul, product, sub, sum } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/** A layer: what it absorbs of longwave, and the heat put into it by anything but longwave, W m⁻². */
export interface StackLayer<V = Value> {
  readonly emissivity: V;
  readonly heating: V;
}

/** The streams at one interface, W m⁻². */
export interface Streams<V = Value> {
  readonly up: V;
  readonly down: V;
  /** up − down. */
  readonly net: V;
  /** up + down. */
  readonly sum: V;
}

/** r = ε/(2 − ε): what a layer adds to the sum of the streams, for each unit of their net. */
const resistance = ({ emissivity }: StackLayer): Value => div(emissivity, sub(2, emissivity));

/** κ = (1 − ε)/ε: what a surface that reflects adds to σT⁴, for each unit of the net stream that leaves it. */
export const reflectance = (surfaceEmissivity: Value): Value =>
  div(sub(1, surfaceEmissivity), surfaceEmissivity);

/** The heat put in above each interface but the top: Q_1 … Q_N. */
function heatAbove(layers: readonly StackLayer[]): Value[] {
  const above: Value[] = [];
  for (const { heating } of layers)
    above.push(above.length > 0 ? add(above.at(-1) as Value, heating) : heating);
  return above;
}

/** What leaves at the top over a surface with a given σT⁴: (σT⁴ + κQ_N + ½(Q_N + Σ r_i(Q_{i−1} + Q_i)))/(1 + Σ r_i + κ). */
export function stackOutgoing(
  layers: readonly StackLayer[],
  surface: { emission: Value; kappa: Value },
): Value {
  const { emission, kappa } = surface;
  if (layers.length === 0) return div(emission, add(1, kappa));
  const heat = heatAbove(layers);
  const all = heat.at(-1) as Value;
  const held = layers.map((layer, i) => {
    const around = i === 0 ? (heat[0] as Value) : add(heat[i - 1] as Value, heat[i] as Value);
    return mul(resistance(layer), around);
  });
  const heatFromLayers = add(mul(kappa, all), mul(0.5, add(all, sum(...held))));
  const blanket = sum(1, ...layers.map(resistance), kappa);
  return div(add(emission, heatFromLayers), blanket);
}

/** The streams at all interfaces, from what leaves at the top. */
export function stackStreams(layers: readonly StackLayer[], outgoing: Value): Streams[] {
  const heat = heatAbove(layers);
  const streams: Streams[] = [{ up: outgoing, down: 0, net: outgoing, sum: outgoing }];
  layers.forEach((layer, i) => {
    const above = streams[i] as Streams;
    const net = sub(outgoing, heat[i] as Value);
    const both = add(above.sum, mul(resistance(layer), add(above.net, net)));
    const up = product(0.5, add(both, net));
    streams.push({ up, down: product(0.5, sub(both, net)), net, sum: both });
  });
  return streams;
}

/** σT⁴ of 0 K and of 10⁵ K, between which all temperatures lie. */
export const EMISSIONS = [0, 5.670374419e12] as const;

/** Smaller than every emissivity that means anything: 10⁹ W m⁻² over it is still a number, and out of every range. */
const NO_EMISSIVITY = 1e-290;

/** σT⁴ of each layer: ½(D above + U below + heating/ε). Beyond all bounds where a layer is heated that cannot emit. */
export function layerEmissions(layers: readonly StackLayer[], streams: readonly Streams[]): Value[] {
  return layers.map(({ emissivity, heating }, i) => {
    const falling = add((streams[i] as Streams).down, (streams[i + 1] as Streams).up);
    return mul(0.5, add(falling, div(heating, max(emissivity, NO_EMISSIVITY))));
  });
}
