// Checks what is given of a stack of leaky layers, and fills in what was left out.
import {
  layerEmissivityPort,
  layerHeatingPort,
  surfaceEmissivityPort,
} from "../greenhouse/leakyStackEmission.ts";
import { reflectance } from "../greenhouse/stackStreams.ts";
import { fail } from "../ground/errors.ts";
import { checkedNumber, type Range } from "../ground/range.ts";
import { temperaturePort } from "../law/ports.ts";
import type { LeakyLayer, LeakyStackOptions } from "./leakyStack.ts";
import { fieldsOf, listed } from "./written.ts";

/** A stack with nothing left out but the temperature, which is found unless given. */
export interface CheckedStack {
  readonly layers: readonly Required<LeakyLayer>[];
  readonly sunlight: number;
  readonly emissivity: number;
  /** (1 − ε)/ε of the surface. */
  readonly kappa: number;
  readonly internalFlux: number;
  readonly temperature: number | undefined;
}

/** What a field may be, and its value where it is left out. */
interface Field {
  readonly unit: string;
  readonly within: Range;
  readonly default?: number;
}

/** What light and the interior may give. */
const HEAT = { unit: "W m-2", within: [0, 1e9] } as const;

const layerFields = () => ({
  emissivity: layerEmissivityPort(),
  sunlight: { ...HEAT, default: 0 },
  convection: { ...layerHeatingPort(), default: 0 },
});

const surfaceFields = () => ({
  sunlight: HEAT,
  emissivity: surfaceEmissivityPort(),
  internalFlux: { ...HEAT, default: 0 },
});

/** Throws the error of the first field that is missing, unknown or out of range; a heated layer must be able to emit. */
export function readLeakyStack(options: LeakyStackOptions, path: string): CheckedStack {
  const given = fieldsOf(options, path, ["layers", "surface"]);
  const asked = layerFields();
  const layers = listed(given.layers, `${path}.layers`, Object.keys(asked)).map((layer, i) =>
    checkedLayer(checkedFields(layer, `${path}.layers[${i}]`, asked), `${path}.layers[${i}]`),
  );
  const fields = surfaceFields();
  const place = `${path}.surface`;
  const surface = fieldsOf(given.surface, place, [...Object.keys(fields), "temperature"]);
  const { temperature } = surface;
  const { unit, within } = temperaturePort();
  const checked = checkedFields(surface, place, fields);
  return {
    layers,
    ...checked,
    kappa: reflectance(checked.emissivity) as number,
    temperature:
      temperature === undefined
        ? undefined
        : checkedNumber(temperature, `${place}.temperature`, unit, within),
  };
}

function checkedFields<K extends string>(
  written: Readonly<Record<string, unknown>>,
  path: string,
  fields: Readonly<Record<K, Field>>,
): Record<K, number> {
  const names = Object.keys(fields) as K[];
  const values = names.map((name) => {
    const { unit, within, default: fallback } = fields[name];
    const value = written[name];
    return [name, checkedNumber(value === undefined ? fallback : value, `${path}.${name}`, unit, within)];
  });
  return Object.fromEntries(values) as Record<K, number>;
}

function checkedLayer(layer: Required<LeakyLayer>, path: string): Required<LeakyLayer> {
  const heating = layer.sunlight + layer.convection;
  if (layer.emissivity === 0 && heating !== 0) {
    const place = `${path} (sunlight + convection; with emissivity 0 no steady state)`;
    fail("out-of-range", { path: place, value: heating, allowed: "0", unit: "W m-2" });
  }
  return layer;
}
