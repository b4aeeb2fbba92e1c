// What follows from a description: states, ledger, diagram, appraisal.
import { duration, number } from "./numbers.mjs";

const HEAD = ["T (K)", "stability", "λ (W m⁻² K⁻¹)", "e-folding time", "albedo", "T of re-radiation (K)"];

const NO_DIAGRAM =
  "No diagram: it needs a stable state, and one luminosity or one flux that may change as the star brightens or fades.";

export function createResults(root) {
  const find = (id) => root.querySelector(`#${id}`);
  const [status, drawn, table, choice, ledger, diagram, text] = [
    ...["status", "drawn", "states", "choice", "ledger", "diagram", "appraisal"],
  ].map(find);
  const dark = matchMedia("(prefers-color-scheme: dark)");
  let shown;
  let chosen = -1;

  const say = (words) => {
    status.textContent = words;
  };

  function show(appraisal, library) {
    shown = { appraisal, library };
    root.classList.remove("stale");
    drawn.hidden = false;
    const { found, states, missing } = appraisal;
    say(found ? foundText(found) : `No states without ${missing.map(({ path }) => path).join(", ")}.`);
    writeTable(table, appraisal);
    chosen = pick(states);
    writeChoice(states);
    text.textContent = library.toText(appraisal);
    draw();
  }

  /** The climates of the description before stay, and say that they are old. */
  function fail(line) {
    root.classList.add("stale");
    const old = shown ? " Below are the climates of the description before." : "";
    say(`The description has a problem in line ${line}.${old}`);
  }

  /** The state that was looked at before if there are as many, else the warmest that holds. */
  function pick(states) {
    if (chosen >= 0 && choice.querySelectorAll("input").length === states.length) return chosen;
    const stable = states.map(({ state }) => state.stability).lastIndexOf("stable");
    return stable < 0 ? states.length - 1 : stable;
  }

  function writeChoice(states) {
    const options = states.map(({ state }, i) => {
      const input = Object.assign(document.createElement("input"), {
        type: "radio",
        name: "state",
        checked: i === chosen,
      });
      input.addEventListener("change", () => {
        chosen = i;
        draw();
      });
      const label = document.createElement("label");
      label.append(input, ` ${number(state.temperature)} K, ${state.stability}`);
      return label;
    });
    choice.replaceChildren(choice.querySelector("legend"), ...options);
    choice.hidden = states.length === 0;
  }

  function draw() {
    if (!shown) return;
    const { appraisal, library } = shown;
    const state = appraisal.states[chosen]?.state;
    const page = {
      width: Math.max(280, Math.floor(ledger.clientWidth)),
      theme: dark.matches ? "dark" : "light",
    };
    const picture = (figure, plot) => {
      figure.innerHTML = plot ? (library.toSVG(plot, page) ?? "") : "";
    };
    picture(ledger, state && library.ledgerDrawing(state.ledger));
    picture(diagram, appraisal.diagram && library.diagramChart(diagramParts(appraisal, state)));
    if (state && !appraisal.diagram) diagram.textContent = NO_DIAGRAM;
  }

  dark.addEventListener("change", draw);
  let width = 0;
  new ResizeObserver(() => {
    if (Math.abs(root.clientWidth - width) < 2) return;
    width = root.clientWidth;
    draw();
  }).observe(root);
  return { say, show, fail };
}

/** The diagram with the planet's place: its star may have been told by other inputs than the diagram runs along. */
function diagramParts({ diagram, starlight }, state) {
  if (!state) return { diagram };
  const { luminosity } = starlight;
  const along =
    diagram.along === "star.luminosity" && luminosity !== null ? { "star.luminosity": luminosity } : {};
  return { diagram, state: { ...state, givens: { ...along, ...state.givens } } };
}

function foundText({ states, within, proof, undecided }) {
  const count = states.length === 1 ? "One state" : `${states.length || "No"} states`;
  const sure = undecided.length > 0 ? `${undecided.length} undecided` : proof;
  return `${count} between ${within[0]} and ${within[1]} K, ${sure}.`;
}

function writeTable(table, { states, description }) {
  const isTimed = description.heatCapacity !== undefined && description.heatCapacity !== "unknown";
  const cell = (tag, words) => Object.assign(document.createElement(tag), { textContent: words });
  const row = (tag, cells) => {
    const line = document.createElement("tr");
    line.append(...cells.map((words) => cell(tag, words)));
    return line;
  };
  const rows = states.map(({ state, equilibriumTemperature }) => [
    number(state.temperature),
    state.stability,
    number(state.feedbackParameter),
    isTimed ? duration(state.eFoldingTime) : "unknown",
    number(state.report.albedo),
    number(equilibriumTemperature),
  ]);
  table.replaceChildren(row("th", HEAD), ...rows.map((cells) => row("td", cells)));
  table.hidden = states.length === 0;
  for (const head of table.querySelectorAll("th")) head.scope = "col";
}
