// The live page: a description in, climates out. Everything heavy waits until the page is painted.
import { createEditor } from "./editor.mjs";
import { faultText } from "./faultText.mjs";
import { PLANETS } from "./planets.mjs";
import { JsonProblem, placeOf, readJson } from "./readJson.mjs";
import { createResults } from "./results.mjs";

/** How long a reader may pause between two keys, ms. */
const PAUSE = 250;

const byId = (id) => document.getElementById(id);
const editor = createEditor(byId("editor"));
const results = createResults(byId("results"));
const planets = byId("planets");
const hottest = byId("hottest");
let library;
let timer;

for (const title of Object.keys(PLANETS)) planets.add(new Option(title));
// what a browser kept of the form is not what the page shows
planets.selectedIndex = hottest.selectedIndex = 0;
editor.text = PLANETS[planets.value];

function update() {
  if (!library) return;
  let places;
  try {
    const read = readJson(editor.text);
    places = read.places;
    const appraisal = library.appraisePlanet(read.value, { within: [50, Number(hottest.value)] });
    editor.say(notesBeside(appraisal.notes, places));
    results.show(appraisal, library);
  } catch (error) {
    const problems = problemsOf(error, places);
    editor.say(problems);
    results.fail(problems[0].line);
  }
}

/** A thrown error, and what else is wrong with the same description, each as something to show at a place. */
function problemsOf(error, places) {
  const problem = { severity: "problem", text: error.message };
  if (error instanceof JsonProblem) return [{ ...problem, line: editor.lineAt(error.at) }];
  if (!(error instanceof library.ThermosteadError)) throw error;
  return [error, ...error.others].map((one) => {
    const more = { href: `errors.html#${one.code}`, text: `About “${one.code.replaceAll("-", " ")}”` };
    return { ...problem, text: faultText(one), more, line: editor.lineAt(placeOf(one.path, places)) };
  });
}

/** Cautions that are about a field stand beside it; all other notes are in the appraisal. */
function notesBeside(notes, places) {
  return notes
    .filter(({ severity, about }) => severity !== "info" && places.has(about))
    .map(({ severity, about, text }) => ({ severity, text, line: editor.lineAt(places.get(about)) }));
}

editor.onInput(() => {
  clearTimeout(timer);
  timer = setTimeout(update, PAUSE);
});
planets.addEventListener("change", () => {
  editor.text = PLANETS[planets.value];
  update();
});
hottest.addEventListener("change", update);
addEventListener("thermostead", ({ detail }) => {
  library = detail;
  update();
});
// two frames on, the first has been painted
requestAnimationFrame(() => requestAnimationFrame(loadLibrary));

function loadLibrary() {
  const script = document.createElement("script");
  script.src = "assets/library.js";
  script.addEventListener("error", () =>
    results.say("The library did not load: assets/library.js is missing."),
  );
  document.head.append(script);
}
