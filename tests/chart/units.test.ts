// Givens are shown in the units in which they were written, as far as these are known.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { diagramChart } from "../../src/chart/diagramChart.ts";
import type { Plot } from "../../src/chart/plot.ts";
import { toSVG, toText } from "../../src/chart/show.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { plain, snowy } from "../appraisal/planets.ts";

const SUN = 3.828e26;
const AU = 149597870700;
const within = [150, 400] as const;
const planet = readPlanet(snowy());
const { loop, units } = planet;
const diagram = traceBranches(loop, {
  along: "star.luminosity",
  between: [0.1 * SUN, 0.4 * SUN],
  within,
});
const state = findStates(loop, { within }).states.at(-1) as never;
const items = (plot: Plot) => plot.layers.flatMap((layer) => layer.items);

test("an older diagram, without units, has that of its parameter and no other", () => {
  const { units, ...older } = diagram;
  const plot = diagramChart({ diagram: older as typeof diagram, state });
  expect(units).toHaveLength(loop.givens.length);
  expect(plot.x).toEqual({ title: "star.luminosity (W)", domain: diagram.between });
  expect(plot.caption[0]).toMatch(/orbit\.semiMajorAxis 6\.8815×10¹⁰, /);
});

describe("a diagram of a loop", () => {
  const plot = diagramChart({ diagram, state });

  test("what is fixed has the unit that it has in the loop", () => {
    expect(plot.x.title).toBe("star.luminosity (W)");
    for (const told of [
      "orbit.semiMajorAxis 6.8815×10¹⁰ m,",
      "albedo.midpoint 266 K,",
      "albedo.cold 0.62,",
      "internalHeat 0.08 W m⁻²,",
      "heatCapacity 2.5×10⁸ J m⁻² K⁻¹",
    ])
      expect(`${plot.caption[0]},`).toContain(`, ${told}`);
  });

  test("and all stands where it does without", () => {
    expect(plot.layers).toEqual(diagramChart({ diagram, state }).layers);
  });
});

describe("with the units of a planet", () => {
  const plot = diagramChart({ diagram, state, units });
  const bare = diagramChart({ diagram, state });

  test("luminosities are those of the Sun, and distances astronomical units", () => {
    expect(plot.x.title).toBe("star.luminosity (solLum)");
    expect(plot.x.domain[0]).toBeCloseTo(0.1, 12);
    expect(plot.x.domain[1]).toBeCloseTo(0.4, 12);
    expect(plot.caption[0]).toContain(", orbit.semiMajorAxis 0.46 au,");
  });

  test("everything that is drawn moves along, and only along the axis", () => {
    const [now, before] = [items(plot), items(bare)];
    expect(now).toHaveLength(before.length);
    now.forEach((item, i) => {
      expect(item.x * SUN).toBeCloseTo(before[i]?.x as number, -14);
      expect(item.y).toBe(before[i]?.y);
    });
    const own = plot.layers.find((layer) => layer.name === "the planet now")?.items;
    expect(own?.map((item) => item.x)).toEqual([expect.closeTo(0.2, 12)]);
  });

  test("a fold says its bounds as they were proved, with their own unit", () => {
    const [fold] = diagram.folds;
    const tips = plot.layers.find((layer) => layer.name === "fold")?.items.map((item) => item.tip);
    const digits = (value: number) => String(value).replace(/e\+?(.*)/, "×10²⁵");
    expect(tips?.[0]).toMatch(/^star\.luminosity \(solLum\) 0\.\d+, temperature/);
    expect(tips?.[0]).toContain(`${digits(fold?.atBracket[0] as number)} to `);
    expect(tips?.[0]).toMatch(/ W$/);
  });

  test("so do boxes of what is not decided, and of where there is no state", () => {
    const parts = {
      ...diagram,
      gaps: [{ parameters: [0.3 * SUN, 0.4 * SUN] as const, too: "hot" as const }],
      undecided: [
        { temperatures: within, parameters: [0.1 * SUN, 0.2 * SUN] as const, kind: "cusp" as const },
      ],
    };
    const boxes = diagramChart({ diagram: parts, units }).layers.filter((layer) => layer.mark === "box");
    const ends = boxes.flatMap((layer) => layer.items.flatMap((item) => [item.x, item.x2]));
    expect(ends).toEqual([0.1, 0.2, 0.3, 0.4].map((end) => expect.closeTo(end, 12)));
  });

  test("an axis of distances is in astronomical units", () => {
    const along = { along: "orbit.semiMajorAxis", between: [0.4 * AU, 0.6 * AU], within } as const;
    const { x, caption } = diagramChart({ diagram: traceBranches(loop, along), units });
    expect(x.title).toBe("orbit.semiMajorAxis (au)");
    expect(x.domain).toEqual([expect.closeTo(0.4, 12), expect.closeTo(0.6, 12)]);
    expect(caption[0]).toContain(", star.luminosity 0.2 solLum,");
  });
});

describe("an appraisal brings its units", () => {
  const shown = (description: unknown) => {
    const appraisal = appraisePlanet(description);
    const { x, caption } = diagramChart({ diagram: appraisal.diagram as never });
    expect(toText(appraisal)).toContain(caption[0]);
    // it comes back from JSON as it was
    expect(toSVG(JSON.parse(JSON.stringify(appraisal)))).toBe(toSVG(appraisal));
    return `${x.title}; ${caption[0]}`;
  };

  it.each([
    ["as written", snowy(), /^star\.luminosity \(solLum\); .*semiMajorAxis 0\.46 au,/],
    [
      "as written otherwise",
      snowy({ star: { luminosity: "7.6e22 kW" }, orbit: { semiMajorAxis: "6.9e7 km" } }),
      /^star\.luminosity \(kW\); .*semiMajorAxis 6\.9×10⁷ km,/,
    ],
    [
      "solar luminosities, where radius and temperature are given",
      plain(),
      /^star\.luminosity \(solLum\); .*semiMajorAxis 0\.46 au,/,
    ],
    ["a flux", plain({ star: undefined, orbit: { flux: "1361 W m-2" } }), /^orbit\.flux \(W m⁻²\); /],
  ])("%s", (_, description, told) => {
    expect(shown(description)).toMatch(told);
  });

  test("and no table of them", () => {
    expect(toText(appraisePlanet(snowy()))).not.toContain("diagram units");
  });
});
