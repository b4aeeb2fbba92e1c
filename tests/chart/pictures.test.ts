// What the pictures say, read from them as data.
import { describe, expect, test } from "vitest";
import { edgesOf } from "../../src/chart/couplingEdges.ts";
import { couplingPlot } from "../../src/chart/couplingGraph.ts";
import { diagramChart } from "../../src/chart/diagramChart.ts";
import { feedbackBars } from "../../src/chart/feedbackBars.ts";
import { ledgerDrawing, ledgerPlot } from "../../src/chart/ledgerDrawing.ts";
import { limitsChart } from "../../src/chart/limitsChart.ts";
import { planetsChart } from "../../src/chart/planetsChart.ts";
import type { Item, Layer, Plot } from "../../src/chart/plot.ts";
import { toSVG, toText } from "../../src/chart/show.ts";
import { budgetChart, statesChart } from "../../src/chart/statesChart.ts";
import type { Ledger } from "../../src/states/state.ts";
import {
  airy,
  budget,
  columns,
  diagram,
  feedbacks,
  flux,
  found,
  held,
  limits,
  manyBranches,
  points,
  state,
  within,
} from "./cases.ts";
import { overlapping, parsed, wordsOf } from "./svgText.ts";

const layer = (plot: Plot, name: string): Layer => {
  const own = plot.layers.filter((l) => l.name === name);
  expect(own).toHaveLength(1);
  return own[0] as Layer;
};
const texts = (plot: Plot): string[] =>
  plot.layers.flatMap((l) => l.items.flatMap((i) => (i.text ? [i.text] : [])));
const only = (items: readonly Item[]): Item => {
  expect(items).toHaveLength(1);
  return items[0] as Item;
};

describe("heating and cooling", () => {
  const plot = budgetChart({ budget, found });

  test("states lie where the curves cross: filled where stable, open where unstable, with their bracket in words", () => {
    const stable = layer(plot, "stable");
    expect([stable.look.open, layer(plot, "unstable").look.open]).toEqual([undefined, true]);
    expect(stable.items.map((i) => i.x)).toEqual([found.states[0]?.temperature, state.temperature]);
    for (const { x, y, tip } of [...stable.items, ...layer(plot, "unstable").items]) {
      const at = found.states.find((s) => s.temperature === x) as typeof state;
      const cooling = at.ledger.flows
        .filter((f) => f.from === "surface")
        .reduce((sum, f) => sum + f.value, 0);
      // straight between points 1.25 K apart: the curvature of σT⁴ makes at most 0.3 W m⁻²
      expect(Math.abs(y - cooling)).toBeLessThan(0.3);
      expect(tip).toContain(`proved bracket ${at.bracket[0]} to ${at.bracket[1]} K`);
    }
  });

  test("a sampled state does not claim a proof", () => {
    const sampled = { ...state, proved: false };
    const { items } = layer(statesChart({ ...found, states: [sampled] }), "stable");
    expect(only(items).tip).toContain("not proved bracket");
  });

  test("what is undecided is a box as high as the picture's curves", () => {
    const undecided = [
      {
        ...{ interval: [200, 210] as const, kind: "flat" as const, counts: null },
        enclosure: null,
        distances: null,
      },
    ];
    const chart = budgetChart({ budget, found: { ...found, undecided, complete: false, proof: "partial" } });
    const box = only(layer(chart, "undecided").items);
    expect([box.x, box.x2, box.tip]).toEqual([200, 210, "flat"]);
    const heights = layer(chart, "cooling").items.map((i) => i.y);
    expect(box.y).toBeLessThan(Math.min(...heights));
    expect(box.y2).toBeGreaterThan(Math.max(...heights));
    expect(chart.caption).toEqual(["States at 150 to 400 K: 3, partial, undecided: 1"]);
  });

  test("points that are not finite are left out and counted, with those that the budget lost", () => {
    const broken = budget.points.map((p, i) =>
      i < 3 ? { ...p, heating: [Number.NaN, 1 / 0, -1 / 0][i] as number } : p,
    );
    const chart = budgetChart({ budget: { ...budget, points: broken, dropped: 2 } });
    expect(layer(chart, "heating").items).toHaveLength(budget.points.length - 3);
    expect(chart.caption).toEqual(["Left out, as not finite or outside: 5"]);
  });

  test("states by themselves have an axis around them, also where the search was wide", () => {
    const { x } = statesChart({ ...found, within: [50, 2500] });
    const [low, high] = [found.states[0]?.temperature as number, state.temperature];
    expect(x.domain[0]).toBeLessThan(low);
    expect(x.domain[1]).toBeGreaterThan(high);
    expect(x.domain[1] - x.domain[0]).toBeLessThan(1.2 * (high - low));
  });

  test("one state, and none", () => {
    expect(statesChart({ ...found, states: [state] }).caption[0]).toContain("States at 150 to 400 K: 1, ");
    expect(statesChart({ ...found, states: [] }).layers.flatMap((l) => l.name ?? [])).toEqual([]);
  });
});

describe("the branch diagram", () => {
  const plot = diagramChart({ diagram, held, state });

  test("has each branch as one line of its stability", () => {
    for (const stability of ["stable", "unstable"] as const) {
      const own = diagram.branches.filter((b) => b.stability === stability);
      const { items, look } = layer(plot, stability);
      expect(items).toHaveLength(own.reduce((sum, b) => sum + b.points.length, 0));
      expect(new Set(items.map((i) => i.line)).size).toBe(own.length);
      expect(look.dash?.[1]).toBe(stability === "stable" ? 0 : 5);
    }
    expect(layer(plot, "couplings held, stable").items.length).toBeGreaterThan(1);
  });

  test("has folds with their proved bracket, and the planet where it is", () => {
    expect(layer(plot, "fold").items.map((i) => [i.x, i.y])).toEqual(
      diagram.folds.map((f) => [f.at, f.temperature]),
    );
    expect(layer(plot, "fold").items[0]?.tip).toContain(`${diagram.folds[0]?.atBracket[0]} to `);
    expect(only(layer(plot, "the planet now").items)).toMatchObject({ x: 1361, y: state.temperature });
  });

  test("shows the way of a slow rise and fall, each arrow in its direction", () => {
    const ends = layer(plot, "jump").items;
    const arrows = plot.layers
      .filter((l) => /^triangle/.test(l.look.shape ?? ""))
      .flatMap((l) => l.items.map((i) => [l.look.shape, i.x]));
    const expected = diagram.jumps.map((j) => [
      (j.to?.temperature ?? 1 / 0) > j.temperature ? "triangle-up" : "triangle-down",
      j.at,
    ]);
    expect(arrows.sort()).toEqual(expected.sort());
    expect(ends).toHaveLength(2 * diagram.jumps.length);
  });

  test("a climate that leaves the range goes to the edge of the picture; a gap is a box", () => {
    const leaving = {
      ...diagram,
      jumps: [
        { ...(diagram.jumps[0] as (typeof diagram.jumps)[number]), to: null, leaves: "hotter" as const },
      ],
      gaps: [{ parameters: [1700, 1900] as const, too: "hot" as const }],
    };
    const chart = diagramChart({ diagram: leaving });
    const top = Math.max(...diagram.branches.map((b) => b.temperatures[1]));
    expect(layer(chart, "jump").items[1]?.y).toBeGreaterThan(top);
    expect(JSON.stringify(chart)).toContain("leaves the searched range, hotter");
    expect(JSON.stringify(chart)).not.toContain("jumps to");
    expect(only(layer(chart, "no state in range").items)).toMatchObject({
      x: 1700,
      x2: 1900,
      tip: "too hot",
    });
  });

  test("nothing is drawn below 0 K, where no jump can lead", () => {
    const [first] = diagram.jumps;
    const cold = {
      ...diagram,
      branches: manyBranches(1).branches.map((b) => ({ ...b, temperatures: [20, 900] as const })),
      jumps: [{ ...(first as NonNullable<typeof first>), to: null, leaves: "colder" as const }],
    };
    const chart = diagramChart({ diagram: cold });
    expect(chart.y.domain[0]).toBe(0);
    expect(layer(chart, "jump").items[1]?.y).toBe(0);
    expect(JSON.stringify(chart)).toContain("leaves the searched range, colder");
    expect(JSON.stringify(plot)).toMatch(/a slow fall jumps to [\d.]+ K/);
  });

  test("a thousand branches are drawn, undecided parts as such", () => {
    const chart = diagramChart({ diagram: manyBranches(1000) });
    const lines = (["stable", "unstable", "undecided"] as const).flatMap((name) =>
      chart.layers
        .filter((l) => l.name === name && l.mark === "line")
        .flatMap((l) => l.items.map((i) => i.line)),
    );
    expect(new Set(lines).size).toBe(1000);
    const boxes = chart.layers.filter((l) => l.mark === "box");
    expect(only(boxes.flatMap((l) => l.items))).toMatchObject({
      x: 1000,
      x2: 1100,
      y: 250,
      y2: 252,
      tip: "continuum",
    });
    expect(chart.caption[0]).toMatch(/^Branches: 1000, partial, undecided: 1/);
  });

  test("a state without the given is left out and counted", () => {
    const chart = diagramChart({ diagram, state: { ...state, givens: { emissivity: 0.6 } } as never });
    expect(chart.layers.map((l) => l.name)).not.toContain("the planet now");
    expect(chart.caption.at(-1)).toBe("Left out, as not finite or outside: 1");
  });
});

describe("the bars of feedbacks", () => {
  test("each begins where the one above ends; the last of them ends at λ, and so does the bar of the sum", () => {
    const plot = feedbackBars(feedbacks);
    const bars = ["counters", "amplifies"]
      .flatMap((name) => plot.layers.filter((l) => l.name === name))
      .flatMap((l) => l.items);
    bars.sort((a, b) => b.y - a.y);
    expect(bars).toHaveLength(2 + feedbacks.loops.length);
    const parts = bars.slice(0, -1);
    parts.reduce((end, bar) => {
      expect(bar.x).toBe(end);
      return bar.x2 as number;
    }, 0);
    const sum = bars.at(-1) as Item;
    expect(parts.at(-1)?.x2).toBeCloseTo(feedbacks.feedbackParameter, 12);
    expect([sum.x, sum.x2]).toEqual([0, feedbacks.feedbackParameter]);
    for (const { x, x2, tip } of parts)
      expect((tip as string).startsWith((x2 as number) > x ? "+" : "−")).toBe(true);
  });

  test("long names of loops are written in lines that fit a telephone, each above its bar", () => {
    const through = ["orbit.incomingStellarFlux", "atmosphere.waterVapour", "albedo.cloudCover"];
    const loops = feedbacks.loops.map((loop) => ({ ...loop, through }));
    const plot = feedbackBars({ ...feedbacks, loops } as never);
    const words = wordsOf(parsed(toSVG(plot, { width: 360 }) as string));
    expect(words.filter((w) => w.left < 0 || w.right > 360)).toEqual([]);
    expect(overlapping(words)).toEqual([]);
    expect(texts(plot).join(" ")).toContain(through.join(" → "));
    const labels = plot.layers.at(-1)?.items.map((i) => i.y) ?? [];
    expect(labels.length).toBeGreaterThan(2 + feedbacks.loops.length);
    const bars = plot.layers.filter((l) => l.mark === "box").flatMap((l) => l.items);
    // letters reach 3 px below their line
    for (const { y, y2 } of bars)
      expect(labels.filter((at) => at + 9 > (y2 as number) && at - 3 < y)).toEqual([]);
  });

  test("there is room on both sides of them", () => {
    const { x, layers } = feedbackBars(feedbacks);
    const ends = layers
      .filter((l) => l.mark === "box")
      .flatMap((l) => l.items.flatMap((i) => [i.x, i.x2 as number]));
    expect(x.domain[0]).toBeLessThan(Math.min(...ends));
    expect(x.domain[1]).toBeGreaterThan(Math.max(...ends));
  });

  test("loops that are not listed are one bar more", () => {
    const others = {
      count: 7,
      feedbackParameter: 0.25,
      feedbackParameterRange: null,
      feedbackFactor: null,
      feedbackFactorRange: null,
    };
    expect(texts(feedbackBars({ ...feedbacks, others }))).toContain("+0.25  weaker loops: 7");
  });
});

describe("the coupling graph", () => {
  test("what reaches the net flux adds up to λ, and what enters a coupling leaves it", () => {
    const { names, edges } = edgesOf(feedbacks as never);
    const into = (place: number) => edges.filter((e) => e.to === place).reduce((sum, e) => sum + e.value, 0);
    const outOf = (place: number) =>
      edges.filter((e) => e.from === place).reduce((sum, e) => sum + e.value, 0);
    expect(names).toEqual(["temperature", "albedo", "haze", "net flux"]);
    expect(into(3)).toBeCloseTo(feedbacks.feedbackParameter, 12);
    for (const place of [1, 2]) expect(into(place)).toBeCloseTo(outOf(place), 12);
    expect(edges.every((e) => e.from < e.to)).toBe(true);
  });

  test("writes signed numbers at the lines, with units where they fit and once below", () => {
    const plot = couplingPlot({ picture: "couplings", feedbacks: feedbacks as never }, 1200);
    expect(
      texts(plot).filter((t) => /^[+−].* W m⁻² K⁻¹ from (temperature|albedo|haze)$/.test(t)),
    ).toHaveLength(5);
    const narrow = couplingPlot({ picture: "couplings", feedbacks: feedbacks as never }, 360);
    expect(texts(narrow).filter((t) => /^[+−][\d.×⁻⁰-⁹]+ from /.test(t))).toHaveLength(5);
    expect(narrow.caption.join()).toContain("Numbers in W m⁻² K⁻¹");
    expect(layer(plot, "counters").look.dash).toBeDefined();
    expect(layer(plot, "amplifies").look.dash).toBeUndefined();
  });
});

describe("the ledger", () => {
  const widths = (plot: Plot): [number, number][] =>
    plot.layers
      .filter((l) => l.look.full)
      .flatMap((l) =>
        [...new Set(l.items.map((i) => i.line))].map((line) => l.items.filter((i) => i.line === line)),
      )
      .map(([first, second, , , , , last]): [number, number] => {
        expect(second?.x).toBe(first?.x);
        return [(first as Item).x, (last as Item).x - (first as Item).x];
      })
      .sort(([a], [b]) => a - b);

  test.each([360, 640, 1200])("bands have one scale, %d px", (width) => {
    const plot = ledgerPlot({ picture: "ledger", ledger: airy }, width);
    const scales = widths(plot).map(([, w], i) => [w, airy.flows[i]?.value as number] as const);
    expect(scales).toHaveLength(airy.flows.length);
    const [w, value] = scales[2] as [number, number];
    // the smallest are drawn as hairlines of 1.2 px
    for (const [wide, flow] of scales) expect(wide).toBeCloseTo(Math.max(1.2, (flow * w) / value), 9);
  });

  const crowd = (count: number): Ledger => ({
    reservoirs: ["space", "high air", "air", "low air", "surface"].map((name) => ({ name, storage: null })),
    flows: Array.from({ length: count }, (_, i) => ({
      ...{ name: `flow ${i}`, from: ["space", "high air", "air", "low air", "surface"][i % 5] as string },
      ...{ to: ["low air", "space", "surface", "high air", "air"][i % 5] as string },
      ...{ value: 40 + ((i * 37) % 23) * 12, standardName: null },
    })),
  });

  test.each([
    [14, 360],
    [26, 360],
    [26, 640],
    [60, 360],
  ])("%d flows at %d px are all inside, apart, and to one scale", (count, width) => {
    const { flows } = crowd(count);
    const plot = ledgerPlot(ledgerDrawing(crowd(count)), width);
    const bands = widths(plot);
    expect(bands).toHaveLength(count);
    expect(plot.caption.join()).not.toContain("Left out");
    const largest = Math.max(...flows.map((f) => f.value));
    const widest = Math.max(...bands.map(([, w]) => w));
    bands.forEach(([left, w], i) => {
      // the smallest are drawn as hairlines of 1.2 px
      expect(w).toBeCloseTo(Math.max(1.2, ((flows[i]?.value as number) / largest) * widest), 9);
      expect(left + w).toBeLessThan(bands[i + 1]?.[0] ?? width - 20);
    });
    // all labels with their grounds, and no label on another
    const svg = parsed(toSVG(ledgerDrawing(crowd(count)), { width }) as string);
    expect(overlapping(wordsOf(svg))).toEqual([]);
    expect(texts(plot).filter((t) => t.length < 3)).toHaveLength(count);
    expect(plot.layers.find((l) => l.look.colour === "paper")?.items).toHaveLength(count);
  });

  test("a flow of nothing is not drawn", () => {
    const still = { ...airy, flows: airy.flows.map((f, i) => (i === 3 ? { ...f, value: 0 } : f)) };
    const plot = ledgerPlot(ledgerDrawing(still), 640);
    expect(widths(plot)).toHaveLength(airy.flows.length - 1);
    expect(JSON.stringify(plot)).not.toContain("window");
    expect(toText(still)).toMatch(/\| window +\| surface +\| space +\| 0 /);
    expect(widths(ledgerPlot(ledgerDrawing({ ...airy, flows: still.flows.slice(3, 4) }), 640))).toEqual([]);
  });

  test("space is on top, then the air, the surface and the interior", () => {
    const plot = ledgerPlot({ picture: "ledger", ledger: airy }, 640);
    const boxes = plot.layers.find((l) => l.mark === "box")?.items ?? [];
    expect([...boxes].sort((a, b) => b.y - a.y).map((b) => b.tip)).toEqual([
      "space",
      "air",
      "surface",
      "interior",
    ]);
    expect(texts(plot)).toContain("+1 kept");
  });

  test("names and numbers stand on the bands, and where they do not fit, letters that are explained", () => {
    const wide = texts(ledgerPlot({ picture: "ledger", ledger: airy }, 1200));
    for (const value of ["150", "70", "340", "30", "91", "190", "311", "1"]) expect(wide).toContain(value);
    const narrow = ledgerPlot({ picture: "ledger", ledger: airy }, 360);
    expect(narrow.caption).toContain("c: longwave of the ground, surface → air, 340");
    expect(narrow.caption.at(-1)).toContain("W m⁻²");
  });

  test("a negative flow runs the other way; one to nowhere is not drawn", () => {
    const flows = [
      { name: "turned", from: "surface", to: "space", value: -50, standardName: null },
      { name: "lost", from: "surface", to: "moon", value: 10, standardName: null },
    ];
    const plot = ledgerPlot({ picture: "ledger", ledger: { reservoirs: airy.reservoirs, flows } }, 640);
    expect(widths(plot)).toHaveLength(1);
    expect(plot.layers.flatMap((l) => l.name ?? [])).toEqual(["from space"]);
    expect(texts(plot)).toContain("50");
  });
});

describe("planets against published limits", () => {
  test("each line has its letter at its end, and its name and paper in the legend", () => {
    const plot = limitsChart({
      planets: [{ name: "Orsolne", effectiveTemperature: 4100, flux: 900 }],
      limits,
    });
    expect(plot.layers.filter((l) => l.mark === "line").map((l) => l.name)).toEqual(
      limits.map((limit, i) => `${"abcd"[i]}: ${limit.name}, ${limit.paper}`),
    );
    const letters = plot.layers.find((l) => l.mark === "text")?.items ?? [];
    expect(letters.map((l) => l.text).sort()).toEqual(["a", "b", "c", "d"]);
    expect(
      new Set(plot.layers.filter((l) => l.mark === "line").map((l) => JSON.stringify(l.look.dash))).size,
    ).toBe(4);
    expect(only(layer(plot, "Orsolne").items)).toMatchObject({ x: 4100, y: 900 });
  });

  test("a limit without a value somewhere loses those points only", () => {
    const broken = points(1).map((p, i) => (i > 9 ? { ...p, flux: Number.NaN } : p));
    const plot = limitsChart({ planets: [], limits: [{ name: "n", paper: "p", points: broken }] });
    expect(layer(plot, "a: n, p").items).toHaveLength(10);
    expect(plot.caption.at(-1)).toBe("Left out, as not finite or outside: 2");
  });
});

describe("many planets", () => {
  test("every state lies at the flux of its row", () => {
    const plot = planetsChart({ states: columns, values: flux });
    const drawn = plot.layers.flatMap((l) => l.items.map((i) => [i.x, i.y]));
    const expected = [...columns.temperatures].map((t, i) => {
      return [flux[[...columns.first].filter((first) => first <= i).length - 1], t];
    });
    expect(drawn.sort()).toEqual(expected.sort());
    expect(layer(plot, "unstable").look.open).toBe(true);
    const counts = [1, 3].map((n) => `${columns.counts.filter((c) => c === n).length} with ${n}`);
    expect(plot.caption).toEqual([`planets by number of states: ${counts.join(", ")}`]);
  });

  test("of very many one in some is drawn, and said; a missing flux is counted", () => {
    const rows = 10_000;
    const first = Uint32Array.from({ length: rows + 1 }, (_, i) => i);
    const states = {
      ...columns,
      rows,
      first,
      counts: new Uint8Array(rows).fill(1),
      temperatures: new Float64Array(rows).fill(250).map((t, i) => t + i / 100),
      stability: new Int8Array(rows).fill(-1),
    };
    const plot = planetsChart({
      states,
      values: Array.from({ length: rows }, (_, i) => (i < 8 ? Number.NaN : i)),
    });
    expect(layer(plot, "stable").items).toHaveLength(2500 - 2);
    expect(plot.caption).toEqual([
      "planets by number of states: 10000 with 1",
      "Drawn is one state in 4",
      "Left out, as not finite or outside: 2",
    ]);
  });
});

test("pictures are frozen and survive JSON", () => {
  const plot = budgetChart({ budget, found });
  expect(Object.isFrozen(plot.layers[0]?.items)).toBe(true);
  expect(JSON.parse(JSON.stringify(plot))).toEqual(plot);
  expect(plot.x.domain).toEqual(within);
});
