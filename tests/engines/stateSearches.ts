// 10³ complete searches for states in the built package: icy planets, planets with water vapour, planets with a ramp.
import * as core from "thermostead";
import { budgetsOf } from "../../bench/budgets.mjs";
import { columnsOf, rowOf, WITHIN } from "../../bench/populations.mjs";
import { Fingerprint } from "./fingerprint.ts";

/** A ramp has kinks, so these searches also meet corners. */
const rampBudget: Parameters<typeof core.closeLoop>[0] = ({ temperature, given, couple }) => {
  const flux = given("flux", 1350, "W m-2", { within: [900, 1800] });
  const frozenBelow = given("midpoint", 265, "K", { within: [250, 280] });
  const albedo = core.rampAlbedo({ temperature, cold: 0.65, warm: 0.3, frozenBelow, openAbove: 285 });
  return {
    heating: { sunlight: core.absorbedFlux({ flux, albedo: couple("albedo", albedo) }) },
    cooling: {
      longwave: core.linearEmission({ temperature, intercept: 210, slope: 1.9, reference: 273.15 }),
    },
    heatCapacity: 4.2e8,
  };
};

/** Fingerprints of whole results by search, `ice, planet 0` and so on. */
export function stateSearches(): {
  count: number;
  states: number;
  proved: number;
  prints: Record<string, string>;
} {
  const { ice, vapour } = budgetsOf(core);
  const kinds = [
    { name: "ice", loop: core.closeLoop(ice), columns: columnsOf("ice", 400) },
    { name: "vapour", loop: core.closeLoop(vapour), columns: columnsOf("vapour", 400) },
    { name: "ramp", loop: core.closeLoop(rampBudget), columns: columnsOf("ice", 200) },
  ];
  const prints: Record<string, string> = {};
  const tally = { count: 0, states: 0, proved: 0 };
  for (const { name, loop, columns } of kinds) {
    const names = loop.givens.map((given) => given.name);
    const wanted = Object.fromEntries(Object.entries(columns).filter(([key]) => names.includes(key)));
    for (let row = 0; row < (wanted.flux?.length ?? 0); row++) {
      const at = rowOf(wanted, row);
      const search = (title: string, within: readonly [number, number]) => {
        const found = core.findStates(loop, { within, at });
        const print = new Fingerprint();
        print.result(found);
        prints[title] = print.text;
        tally.count++;
        tally.states += found.states.length;
        if (found.complete) tally.proved++;
        return found;
      };
      const [first] = search(`${name}, planet ${row}`, WITHIN as [number, number]).states;
      // A range that ends at a state cannot be decided, so results with doubts are compared too.
      if (first && row % 10 === 0)
        search(`${name}, planet ${row} up to a state`, [WITHIN[0] as number, first.temperature]);
    }
  }
  return { ...tally, prints };
}
