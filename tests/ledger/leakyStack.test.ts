// Leaky layers: every flow against exact balances, and what holds for any stack.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  closeLoop,
  findStates,
  greyGroundTemperature,
  type LeakyStackLedger,
  type LeakyStackOptions,
  layeredGroundTemperature,
  leakyStackEmission,
  leakyStackLedger,
  opaqueLayers,
  stackSunlight,
} from "../../src/index.ts";
import { settings } from "../properties/settings.ts";
import table from "../reference/computed/vi_n_layer.json" with { type: "json" };
import { refusal } from "../refusal.ts";

/** Two dozen roundings of the largest stream in a stack. */
const ROUNDINGS = 24 * 2 ** -53;

type Case = (typeof table.cases)[number];

/** A case of the table: convection is what its layers are given and its ground gives. */
function stackOf({ inputs }: Case) {
  const layers = inputs.emissivities.map((emissivity, i) => ({
    emissivity: Number(emissivity),
    absorptivity: Number(inputs.absorptivities[i]),
    convection: Number(inputs.layerHeating?.[i] ?? 0),
  }));
  const sunlight = stackSunlight({
    incoming: Number(inputs.S) / 4,
    surfaceAlbedo: Number(inputs.albedo),
    layers: layers.map(({ absorptivity }) => ({ absorptivity })),
  });
  const options = {
    layers: layers.map(({ emissivity, convection }, i) => ({
      emissivity,
      convection,
      sunlight: sunlight.layers[i] as number,
    })),
    surface: { sunlight: sunlight.surface, emissivity: Number(inputs.groundEmissivity) },
  };
  return { sunlight, options };
}

describe.each(table.cases.map((row) => [row.id, row] as const))("%s", (_, row) => {
  const { sunlight, options } = stackOf(row);
  const ledger = leakyStackLedger(options);
  const largest = Math.max(...row.interfaces.flatMap((i) => Object.values(i).map(Number)));
  const expectSame = (ours: unknown, reference: string, what: string) =>
    expect(Math.abs((ours as number) - Number(reference)), what).toBeLessThanOrEqual(ROUNDINGS * largest);

  test("has every stream at every interface", () => {
    expect(ledger.interfaces).toHaveLength(row.interfaces.length);
    row.interfaces.forEach((streams, i) => {
      expectSame(sunlight.interfaces[i]?.down, streams.sunlightDown, `sunlight down at ${i}`);
      expectSame(sunlight.interfaces[i]?.up, streams.sunlightUp, `sunlight up at ${i}`);
      expectSame(ledger.interfaces[i]?.down, streams.longwaveDown, `longwave down at ${i}`);
      expectSame(ledger.interfaces[i]?.up, streams.longwaveUp, `longwave up at ${i}`);
    });
    expectSame(sunlight.planetaryAlbedo * largest, `${Number(row.planetaryAlbedo) * largest}`, "albedo");
  });

  test("has what every layer and the ground absorb and emit, and how warm they are", () => {
    expect(ledger.layers).toHaveLength(row.layers.length);
    row.layers.forEach((layer, i) => {
      expectSame(ledger.layers[i]?.temperature, layer.T, `T of layer ${i}`);
      expectSame(ledger.layers[i]?.absorbed, layer.longwaveAbsorbed, `absorbed by layer ${i}`);
      expectSame(ledger.layers[i]?.emitted, layer.longwaveEmitted, `emitted by layer ${i}`);
      expectSame(sunlight.layers[i], layer.sunlight, `sunlight in layer ${i}`);
    });
    expectSame(ledger.surface.temperature, row.ground.T, "T of the ground");
    expectSame(ledger.surface.absorbed, row.ground.longwaveAbsorbed, "absorbed by the ground");
    expectSame(ledger.surface.emitted, row.ground.longwaveEmitted, "emitted by the ground");
    expectSame(sunlight.surface, row.ground.sunlight, "sunlight on the ground");
  });

  test("lists the same streams as flows between neighbours", () => {
    const flow = (name: string) => ledger.flows.find((f) => f.name === name)?.value;
    row.interfaces.forEach((streams, i) => {
      expectSame(flow(`longwave up at ${i}`), streams.longwaveUp, `up at ${i}`);
      if (i > 0) expectSame(flow(`longwave down at ${i}`), streams.longwaveDown, `down at ${i}`);
    });
    row.layers.forEach((layer, i) => {
      expectSame(flow(`sunlight to layer ${i + 1}`), layer.sunlight, `sunlight to layer ${i}`);
      expectSame(flow(`convection to layer ${i + 1}`) ?? 0, row.inputs.layerHeating?.[i] ?? "0", `air ${i}`);
    });
    expectSame(flow("sunlight to surface"), row.ground.sunlight, "sunlight to the ground");
  });
});

const share = fc.double({ min: 0, max: 1, noNaN: true });
const heat = fc.double({ min: 0, max: 400, noNaN: true });
/** A layer that emits less than this and is heated by 800 W m⁻² would be hotter than 10⁵ K, which is refused. */
const LEAST = 1e-9;
const emissivities = fc.oneof(
  fc.double({ min: LEAST, max: 1, noNaN: true }),
  fc.double({ min: LEAST, max: 1e-6, noNaN: true }),
  fc.constantFrom(0, 1),
);
const layer = fc.record({
  emissivity: emissivities,
  sunlight: heat,
  convection: heat,
});
const layers = fc.array(
  layer.map((l) => (l.emissivity === 0 ? { ...l, sunlight: 0, convection: 0 } : l)),
  { maxLength: 40, size: "max" },
);
/** Stacks in balance: the surface gives its air no more than it gets. */
const stacks = fc
  .tuple(layers, heat, fc.double({ min: 1e-3, max: 1, noNaN: true }), heat)
  .map(([list, sunlight, emissivity, internalFlux]): LeakyStackOptions => {
    const carried = list.reduce((sum, l) => sum + l.convection, 0);
    return { layers: list, surface: { sunlight: sunlight + carried, emissivity, internalFlux } };
  });

/** Inflow − outflow − storage in plain arithmetic, over the largest flow; nothing for space and the interior. */
function leftOver({ flows, reservoirs }: LeakyStackLedger): number[] {
  return reservoirs.flatMap(({ name, storage }) => {
    if (storage === null) return [];
    const touching = flows.filter((f) => f.from === name || f.to === name);
    const gained = touching.reduce((sum, f) => sum + (f.to === name ? f.value : -f.value), 0);
    const largest = Math.max(...touching.map((f) => Math.abs(f.value)));
    return [largest === 0 ? 0 : Math.abs(gained - storage) / largest];
  });
}

describe("any stack", () => {
  test("closes at every reservoir, to 1e-12 of its largest flow", () => {
    let reservoirs = 0;
    fc.assert(
      fc.property(stacks, (stack) => {
        const left = leftOver(leakyStackLedger(stack));
        reservoirs += left.length;
        for (const share of left) expect(share).toBeLessThanOrEqual(1e-12);
      }),
      settings(300),
    );
    expect(reservoirs).toBeGreaterThan(3000);
  });

  test("closes at a temperature that is not in balance, where the surface stores what is left", () => {
    const kelvin = fc.double({ min: 100, max: 800, noNaN: true });
    fc.assert(
      fc.property(stacks, kelvin, (stack, temperature) => {
        const ledger = leakyStackLedger({ ...stack, surface: { ...stack.surface, temperature } });
        for (const share of leftOver(ledger)) expect(share).toBeLessThanOrEqual(1e-12);
        expect(ledger.surface.temperature).toBe(temperature);
        if (stack.layers.length === 0) return;
        const emission = leakyStackEmission({
          temperature,
          layers: stack.layers.map((l) => ({
            emissivity: l.emissivity,
            heating: (l.sunlight as number) + (l.convection as number),
          })),
          surfaceEmissivity: stack.surface.emissivity as number,
        });
        expect(ledger.interfaces[0]?.up).toBe(emission);
      }),
      settings(200),
    );
  });

  test("emits all that it is given at the temperature that its ledger finds", () => {
    fc.assert(
      fc.property(stacks, (stack) => {
        const ledger = leakyStackLedger(stack);
        const again = leakyStackLedger({
          ...stack,
          surface: { ...stack.surface, temperature: ledger.surface.temperature },
        });
        const up = ledger.interfaces.map((i) => i.up);
        again.interfaces.forEach((streams, i) => {
          // forty layers, each with a few roundings of the streams that it passes on
          expect(Math.abs(streams.up - (up[i] as number))).toBeLessThanOrEqual(1e-12 * Math.max(...up));
        });
      }),
      settings(200),
    );
  });

  test("has no layer colder than nothing: all temperatures and streams are positive", () => {
    fc.assert(
      fc.property(stacks, (stack) => {
        const ledger = leakyStackLedger(stack);
        const largest = Math.max(...ledger.interfaces.map((i) => i.up));
        for (const { up, down } of ledger.interfaces) {
          expect(Math.min(up, down)).toBeGreaterThanOrEqual(-1e-14 * largest);
        }
        for (const { name, temperature } of ledger.layers) {
          const { emissivity } = stack.layers[Number(name.slice(6)) - 1] as { emissivity: number };
          expect(temperature === null).toBe(emissivity === 0);
        }
      }),
      settings(100),
    );
  });
});

describe("limits", () => {
  const unheated = (count: number, emissivity: number) =>
    Array.from({ length: count }, () => ({ emissivity, heating: 0 }));
  const blanketOf = (count: number, emissivity: number) =>
    (5.670374419e-8 * 300 ** 4) /
    leakyStackEmission({ temperature: 300, layers: unheated(count, emissivity) });

  test("leaky layers become opaque ones: T_s⁴/T_e⁴ falls short of N + 1 by 2N(1 − ε)", () => {
    for (const count of [1, 2, 5, 20]) {
      const opaque = (opaqueLayers({ effectiveTemperature: 1, layers: count }) ** 4) as number;
      expect(Math.abs(blanketOf(count, 1) - opaque)).toBeLessThanOrEqual(1e-14 * opaque);
      for (const leak of [1e-2, 1e-3, 1e-5]) {
        const short = (opaque - blanketOf(count, 1 - leak)) / (2 * count * leak);
        // the next term of r = ε/(2 − ε) is +2(1 − ε)²; rounding of the blanket over the leak
        expect(Math.abs(short - (1 - leak))).toBeLessThanOrEqual(leak * leak + (1e-15 * opaque) / leak);
      }
    }
  });

  test("N layers become a grey column: T_s⁴/T_e⁴ falls short by (Dτ)³/24N²", () => {
    for (const depth of [0.5, 2, 6]) {
      const closure = 1.5;
      const slant = closure * depth;
      const column = greyGroundTemperature({ effectiveTemperature: 1, opticalDepth: depth, closure }) ** 4;
      let before = Number.POSITIVE_INFINITY;
      for (const count of [10, 20, 40, 80]) {
        const blanket = blanketOf(count, -Math.expm1(-slant / count));
        const share = ((column - blanket) * 24 * count * count) / slant ** 3;
        // the next term of the tangent is −(Dτ/N)²/10 of this one
        expect(Math.abs(share - 1)).toBeLessThanOrEqual((slant / count) ** 2 / 9.9 + 1e-9);
        expect(Math.abs(share - 1)).toBeLessThan(before);
        before = Math.abs(share - 1);
        const law = layeredGroundTemperature({ effectiveTemperature: 1, opticalDepth: depth, layers: count });
        expect(Math.abs(law ** 4 - blanket)).toBeLessThanOrEqual(1e-14 * blanket);
      }
    }
  });
});

describe("in a loop", () => {
  const heated = [
    { emissivity: 0.4, sunlight: 15, convection: 10 },
    { emissivity: 0.7, sunlight: 40, convection: 60 },
  ];
  const loop = closeLoop(({ temperature, given }) => {
    const lower = given("emissivity", 0.7, "1", { within: [0, 1] });
    const list = heated.map((l, i) => ({
      emissivity: i === 0 ? l.emissivity : lower,
      heating: l.sunlight + l.convection,
    }));
    return {
      heating: { sunlight: 235 },
      cooling: { longwave: leakyStackEmission({ temperature, layers: list, surfaceEmissivity: 0.96 }) },
      heatCapacity: 0,
    };
  });

  test("the state is proved, and its ledger is that of the stack in balance", () => {
    const found = findStates(loop, { within: [150, 400] });
    expect([found.proof, found.states.length]).toEqual(["proved", 1]);
    const balanced = leakyStackLedger({ layers: heated, surface: { sunlight: 180, emissivity: 0.96 } });
    expect(found.states[0]?.temperature).toBeCloseTo(balanced.surface.temperature, 10);
    expect(found.states[0]?.notes).toEqual([]);
  });

  test("a state in which a heated layer cannot emit is marked as invalid", () => {
    const [state] = findStates(loop, { within: [150, 400], at: { emissivity: 0 } }).states;
    expect(state?.proved).toBe(false);
    expect(state?.notes.map((note) => [note.code, note.about])).toEqual([
      [
        "outside-range",
        "leakyStackEmission.hottest (σT⁴ of the hottest layer; one of emissivity 0 cannot be heated)",
      ],
    ]);
  });
});

describe("a stack refuses", () => {
  const wrong = (value: unknown) => value as never;
  const surface = { sunlight: 160 };
  const clear = { emissivity: 0, heating: 0 };
  test.each<[string, () => unknown, string, string]>([
    [
      "a heated layer of emissivity 0, as a law",
      () => leakyStackEmission({ temperature: 280, layers: [{ emissivity: 0, heating: 1e-9 }] }),
      "out-of-range",
      "leakyStackEmission.hottest (σT⁴ of the hottest layer; one of emissivity 0 cannot be heated)",
    ],
    [
      "a cooled layer of emissivity 0, as a law",
      () => leakyStackEmission({ temperature: 280, layers: [{ emissivity: 0, heating: -1e-9 }, clear] }),
      "out-of-range",
      "leakyStackEmission.coldest (σT⁴ of the coldest layer)",
    ],
    [
      "a layer that gives away more than it gets, as a law",
      () => leakyStackEmission({ temperature: 280, layers: [{ emissivity: 0.5, heating: -500 }, clear] }),
      "out-of-range",
      "leakyStackEmission.coldest (σT⁴ of the coldest layer)",
    ],
    [
      "a layer in sunlight that cannot emit",
      () => leakyStackLedger({ layers: [{ emissivity: 0, sunlight: 1 }], surface }),
      "out-of-range",
      "leakyStackLedger.layers[0] (sunlight + convection; with emissivity 0 no steady state)",
    ],
    [
      "a layer that air heats and that cannot emit",
      () => leakyStackLedger({ layers: [{ emissivity: 1 }, { emissivity: 0, convection: 1 }], surface }),
      "out-of-range",
      "leakyStackLedger.layers[1] (sunlight + convection; with emissivity 0 no steady state)",
    ],
    [
      "a layer that gives heat away and that cannot emit",
      () => leakyStackLedger({ layers: [{ emissivity: 1 }, { emissivity: 0, convection: -1e-9 }], surface }),
      "out-of-range",
      "leakyStackLedger.layers[1] (sunlight + convection; with emissivity 0 no steady state)",
    ],
    [
      "a layer that gives away more than it gets",
      () => leakyStackLedger({ layers: [{ emissivity: 0.5, convection: -400 }], surface }),
      "out-of-range",
      "leakyStackLedger.layers[0] (σT⁴ in steady state)",
    ],
    [
      "a surface that gives away more than it gets",
      () => leakyStackLedger({ layers: [{ emissivity: 0.5, convection: 400 }], surface }),
      "out-of-range",
      "leakyStackLedger.surface (σT⁴ in steady state)",
    ],
    [
      "a layer without emissivity",
      () => leakyStackLedger({ layers: [wrong({ sunlight: 1 })], surface }),
      "missing",
      "leakyStackLedger.layers[0].emissivity",
    ],
    ["no surface", () => leakyStackLedger(wrong({ layers: [] })), "unreadable", "leakyStackLedger.surface"],
    [
      "a misspelt field",
      () => leakyStackLedger({ layers: [wrong({ emisivity: 1 })], surface }),
      "unknown-name",
      "leakyStackLedger.layers[0].emisivity",
    ],
    [
      "layers that are no list",
      () => leakyStackLedger({ layers: wrong({ emissivity: 1 }), surface }),
      "unreadable",
      "leakyStackLedger.layers",
    ],
    [
      "null for heat",
      () => leakyStackLedger({ layers: [{ emissivity: 1, sunlight: wrong(null) }], surface }),
      "not-a-number",
      "leakyStackLedger.layers[0].sunlight",
    ],
    [
      "an absorptivity above 1",
      () => stackSunlight({ incoming: 340, surfaceAlbedo: 0.1, layers: [{ absorptivity: 1.1 }] }),
      "out-of-range",
      "stackSunlight.layers[0].absorptivity",
    ],
    [
      "sunlight below 0",
      () => stackSunlight({ incoming: -1, surfaceAlbedo: 0.1, layers: [] }),
      "out-of-range",
      "stackSunlight.incoming",
    ],
  ])("%s", (_, call, code, path) => {
    expect(refusal(call)).toMatchObject({ code, path });
  });

  test("nothing of a layer of emissivity 0 that is left alone", () => {
    const layers = [{ emissivity: 0.5, sunlight: 20 }, { emissivity: 0 }];
    const ledger = leakyStackLedger({ layers, surface });
    expect(ledger.layers[1]).toMatchObject({ temperature: null, absorbed: 0, emitted: 0 });
    expect(ledger.interfaces[2]).toEqual(ledger.interfaces[1]);
    expect(ledger.surface.temperature).toBe(
      leakyStackLedger({ layers: layers.slice(0, 1), surface }).surface.temperature,
    );
  });
});

test("air that brings heat down is a flow too, and closes", () => {
  const ledger = leakyStackLedger({
    layers: [
      { emissivity: 0.8, sunlight: 60 },
      { emissivity: 0.7, convection: -15 },
    ],
    surface: { sunlight: 160 },
  });
  expect(ledger.flows.filter((f) => f.name.startsWith("convection"))).toMatchObject([
    { name: "convection to layer 2", from: "surface", to: "layer 2", value: -15 },
  ]);
  for (const share of leftOver(ledger)) expect(share).toBeLessThanOrEqual(1e-12);
});

test("the flows at the top and at the surface carry the standard names of the CF conventions, and no others", () => {
  const { flows } = leakyStackLedger({
    layers: [{ emissivity: 0.8 }, { emissivity: 0.7 }],
    surface: { sunlight: 160 },
  });
  // from memory of the CF standard name table
  const named = flows.flatMap((f) => (f.standardName === null ? [] : [[f.name, f.standardName]]));
  expect(Object.fromEntries(named)).toEqual({
    "sunlight to surface": "surface_net_downward_shortwave_flux",
    "longwave up at 0": "toa_outgoing_longwave_flux",
    "longwave up at 2": "surface_upwelling_longwave_flux_in_air",
    "longwave down at 2": "surface_downwelling_longwave_flux_in_air",
  });
});

test("what is not absorbed is reflected: sunlight closes", () => {
  const list = fc.array(fc.record({ absorptivity: share }), { maxLength: 20 });
  fc.assert(
    fc.property(heat, share, list, (incoming, surfaceAlbedo, absorbers) => {
      const found = stackSunlight({ incoming, surfaceAlbedo, layers: absorbers });
      const absorbed = found.layers.reduce((sum, x) => sum + x, found.surface);
      expect(Math.abs(absorbed + found.reflected - incoming)).toBeLessThanOrEqual(64 * 2 ** -53 * incoming);
      expect(Math.abs(found.reflected - found.planetaryAlbedo * incoming)).toBeLessThanOrEqual(
        1e-14 * incoming,
      );
    }),
    settings(200),
  );
});
