// Writes the climate of a planet as plain text of at most 80 columns.

const WIDTH = 80;
const YEAR = 365.25 * 86400;

/** The whole page. */
export function pageOf({ planet, found, feedbacks, margins, sources, fixed }) {
  const { description } = planet;
  const star = description.star?.name ? `, a planet of ${description.star.name}` : "";
  const stable = found.states.filter((state) => state.stability === "stable");
  return [
    `${description.name ?? "A planet"}${star}`,
    ...wrapped([description.source, ...(description.notes ?? [])].filter(Boolean).join(". "), 0, WIDTH),
    ...section("Inputs", inputLines(planet)),
    ...section("Starlight", starlightLines(planet)),
    ...section(`States with the surface between ${found.within.join(" K and ")} K`, stateLines(found)),
    ...(stable.length > 0 ? section("Ledger of each stable state, W m-2", ledgerLines(stable)) : []),
    ...(feedbacks.length > 0
      ? section("What holds each stable state, W m-2 K-1", feedbackLines(feedbacks))
      : []),
    ...(margins.length > 0
      ? section(`Where each branch ends, along ${margins[0].along}`, marginLines(margins))
      : []),
    ...(fixed ? section("The same planet with its albedo a plain number", fixedLines(fixed)) : []),
    ...section("Notes", noteLines(planet, found)),
    ...section("Sources", sourceLines(planet, sources)),
    "",
    ...wrapped(
      "These are screening estimates from a zero-dimensional model, with one temperature for the whole planet. Where a full climate model has been run, trust that model first.",
      0,
      WIDTH,
    ),
  ].join("\n");
}

const section = (title, lines) => ["", title, ...lines.map((line) => `  ${line}`.trimEnd())];

/** Breaks a text at spaces; `hang` is the indent of the lines that follow the first. */
function wrapped(text, hang = 0, width = WIDTH - 2) {
  const lines = [];
  let line = "";
  for (const word of text.split(/\s+/).filter(Boolean)) {
    if (line !== "" && line.length + 1 + word.length > width) {
      lines.push(line);
      line = " ".repeat(hang) + word;
    } else line += (line.trim() === "" ? "" : " ") + word;
  }
  return line === "" ? lines : [...lines, line];
}

/** Rows as columns: texts to the left, columns named in `right` to the right. */
function table(rows, right = []) {
  const widths = rows[0].map((_, i) => Math.max(...rows.map((row) => String(row[i]).length)));
  const cell = (text, i) =>
    right.includes(i) ? String(text).padStart(widths[i]) : String(text).padEnd(widths[i]);
  return rows.map((row) => row.map(cell).join("  "));
}

/** A number for reading: four to six digits, and powers of ten only where they help. */
function shown(value, digits = 5) {
  if (value === 0) return "0";
  const size = Math.abs(value);
  return size < 1e-3 || size >= 1e6
    ? value.toExponential(digits - 2)
    : String(Number(value.toPrecision(digits)));
}

function inputLines({ description, inputs }) {
  const laws = ["albedo", "longwave", "heatCapacity"].filter((place) => description[place].law);
  const rows = inputs.flatMap(({ path, written, value, unit }, i) => {
    const si = unit === "1" ? shown(value) : `${shown(value)} ${unit}`;
    const place = laws.find(
      (name) => path.startsWith(`${name}.`) && !inputs[i - 1]?.path.startsWith(`${name}.`),
    );
    const row = [path, written, written.startsWith(si) || written.endsWith(` ${unit}`) ? "" : `= ${si}`];
    return place ? [[place, description[place].law, ""], row] : [row];
  });
  return table(rows);
}

function starlightLines({ flux, equilibriumTemperature, assumptions }) {
  const { redistribution, average, eccentricity, internalHeat } = assumptions;
  const mean = average === null ? "" : `; mean ${average} over the orbit, e = ${eccentricity}`;
  const f = `f = ${shown(redistribution)}`;
  const heat = internalHeat > 0 ? `, internal heat ${shown(internalHeat)} W m-2` : "";
  const equilibrium = equilibriumTemperature
    ? `equilibrium temperature ${equilibriumTemperature.value.toFixed(2)} K, with albedo ${shown(equilibriumTemperature.albedo)}, ${f}${heat}; it is not the surface temperature`
    : `equilibrium temperature: below, with each state, because the albedo answers to temperature (${f}${heat})`;
  return [
    `stellar flux S = ${flux.toFixed(1)} W m-2 (normal to the beam${mean})`,
    `spread with ${f}: f S = ${(redistribution * flux).toFixed(1)} W m-2`,
    equilibrium,
  ].flatMap((line) => wrapped(line, 2));
}

function stateLines(found) {
  if (found.states.length === 0) return ["none found", ...searchLines(found)];
  const head = ["T surface", "", "lambda", "e-folding", "albedo", "T equilibrium"];
  const units = ["K", "", "W m-2 K-1", "yr", "1", "K, not surface"];
  const rows = found.states.map((state) => [
    state.temperature.toFixed(3),
    state.stability,
    state.feedbackParameter.toFixed(3),
    state.eFoldingTime === null ? "-" : shown(state.eFoldingTime / YEAR, 4),
    state.report.albedo.toFixed(4),
    state.report.equilibriumTemperature.toFixed(2),
  ]);
  return [...table([head, units, ...rows], [0, 2, 3, 4, 5]), ...searchLines(found)];
}

function searchLines({ proof, complete, undecided, within }) {
  const range = `between ${within.join(" and ")} K`;
  const said = complete
    ? `proved: no other state ${range}`
    : `${proof}: other states ${range} may exist; undecided stretches: ${undecided.length}`;
  return [
    said,
    ...undecided.map(
      ({ kind, interval }) => `  ${kind} between ${interval.map((t) => shown(t)).join(" and ")} K`,
    ),
  ];
}

/** One column for each state; the two last rows show that what goes in comes out or is stored. */
function ledgerLines(states) {
  const column = (of) =>
    states.map((state) =>
      of(state.ledger)
        .toFixed(4)
        .replace(/^-(0\.0*)$/, "$1"),
    );
  const flows = states[0].ledger.flows.map(({ name, from, to }, i) => [
    name,
    `${from} to ${to}`,
    ...column((ledger) => ledger.flows[i].value),
  ]);
  const surface = ({ flows }) =>
    flows.reduce(
      (sum, { from, to, value }) => sum + (to === "surface" ? value : from === "surface" ? -value : 0),
      0,
    );
  const stored = ({ reservoirs }) => reservoirs.find(({ name }) => name === "surface").storage;
  const head = ["flow", "", ...states.map((state) => `at ${state.temperature.toFixed(2)} K`)];
  const sums = [
    ["surface", "in minus out", ...column(surface)],
    ["", "stored", ...column(stored)],
  ];
  const right = states.map((_, i) => i + 2);
  return table([head, ...flows, ...sums], right);
}

/** λ of each state as the sum of its parts. */
function feedbackLines(feedbacks) {
  const signed = (value) => `${value < 0 ? "-" : "+"}${Math.abs(value).toFixed(3)}`;
  const rows = feedbacks.flatMap(({ temperature, feedbackParameter, reference, loops, gain }) => [
    [`at ${temperature.toFixed(2)} K`, reference.kind, signed(reference.feedbackParameter), ""],
    ...loops.map((loop) => [
      "",
      loop.through.join(" to "),
      signed(loop.feedbackParameter),
      `${loop.effect}${loop.feedbackFactor === null ? "" : `, f = ${loop.feedbackFactor.toFixed(4)}`}`,
    ]),
    ["", "lambda", signed(feedbackParameter), gain === null ? "" : `gain ${gain.toFixed(3)}`],
  ]);
  return table(rows, [2]);
}

/** How far the star may brighten or fade before a state is lost, what comes then, and whether there is a way back. */
function marginLines(margins) {
  const lines = margins.flatMap((margin) =>
    [margin.rise, margin.fall].map((side) => {
      const { direction, end, relative, jump, time } = side;
      const way = `${direction === "rise" ? "+" : "-"}${(100 * relative).toFixed(2)} %`;
      const start = `at ${margin.temperature.toFixed(2)} K, ${direction} by ${way}:`;
      if (!jump) return `${start} no end of the branch in the searched range`;
      const next = jump.to
        ? `jumps to ${jump.to.temperature.toFixed(2)} K`
        : `leaves the range, ${jump.leaves}`;
      const years = time === null ? "" : `, in ${(time / (1e9 * YEAR)).toFixed(2)} Gyr`;
      const back =
        jump.returnsAt === null ? "no return" : `returns at ${shown(jump.returnsAt / margin.at)} of today`;
      return `${start} ${end.kind} at ${end.temperature.toFixed(2)} K${years}; ${next}; ${back}`;
    }),
  );
  const [{ proof, at, unit }] = margins;
  return [...lines, `today ${shown(at)} ${unit}; all else fixed; diagram: ${proof}`].flatMap((l) =>
    wrapped(l, 2),
  );
}

function fixedLines({ albedo, planet, found }) {
  const states = found.states.map(
    ({ temperature, stability, feedbackParameter }) =>
      `surface ${temperature.toFixed(3)} K, ${stability}, lambda ${feedbackParameter.toFixed(3)} W m-2 K-1`,
  );
  const { value, redistribution } = planet.equilibriumTemperature;
  return [
    `albedo ${albedo.toFixed(4)}, that of the warmest stable state`,
    ...states,
    `equilibrium temperature ${value.toFixed(2)} K (f = ${shown(redistribution)}), not the surface temperature`,
    ...searchLines(found),
  ];
}

/** The same note on several states is one note. */
function noteLines({ notes, assumptions }, found) {
  const places = new Map();
  for (const state of found.states) {
    for (const { severity, about, text } of state.notes) {
      const key = JSON.stringify({ severity, about, text });
      places.set(key, [...(places.get(key) ?? []), state.temperature.toFixed(2)]);
    }
  }
  const ofStates = [...places].map(([key, at]) => {
    const { severity, about, text } = JSON.parse(key);
    return { severity, about: `${about} at ${at.join(", ")} K`, value: null, text };
  });
  const lines = [...notes, ...found.notes, ...ofStates].flatMap(({ severity, about, value, text }) => {
    const number = value === null ? "" : ` ${shown(value)}`;
    return wrapped(`${severity === "info" ? "" : `${severity}: `}${about}${number}: ${text}`, 2);
  });
  return [...lines, `constants: ${assumptions.constants}`];
}

/** Laws and inputs that share a source stand together. */
function sourceLines({ inputs }, laws) {
  const bySource = new Map();
  const named = [
    ...laws.map(({ law, source }) => [law, source]),
    ...inputs.filter(({ source }) => source).map(({ path, source }) => [path, source]),
  ];
  for (const [name, source] of named) bySource.set(source, [...(bySource.get(source) ?? []), name]);
  return [...bySource].flatMap(([source, names]) => wrapped(`${names.join(", ")}: ${source}`, 2));
}
