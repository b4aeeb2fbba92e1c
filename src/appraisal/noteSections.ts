// What the report says of what is missing, assumed, doubtful and published.
import type { Appraisal } from "./appraisal.ts";
import { duration, type Section, withUnit, YEAR } from "./report.ts";

/** As much of a note as a line says. */
interface Noted {
  readonly code: string;
  readonly severity: string;
  readonly about: string;
  readonly value: number | null;
  readonly unit: string;
  readonly text: string;
}

/** What is not given, what is assumed, cautions, other notes, sources. */
export function noteSections(appraisal: Appraisal): Section[] {
  const { missing, notes, found, states, diagram, constants, sources, version } = appraisal;
  const lineOf = linesWith(appraisal);
  const assumed = notes.filter((note) => note.code === "assumption" && note.severity === "info");
  const rest: readonly Noted[] = notes.filter((note) => !assumed.includes(note));
  const searched = [...(found?.notes ?? []), ...(diagram?.notes ?? [])];
  const ofStates = states.flatMap(({ state, feedbacks }) =>
    [...state.notes, ...(feedbacks?.notes ?? [])].map((note) => ({ note, at: state.temperature })),
  );
  const lines = (kinds: readonly string[]): string[] => {
    const isOne = (note: { readonly severity: string }) => kinds.includes(note.severity);
    return merged([
      ...rest.filter(isOne).map((note) => ({ text: lineOf(note, note.value), at: null })),
      ...searched.filter(isOne).map((note) => ({ text: lineOf(note, null), at: null })),
      ...ofStates
        .filter(({ note }) => isOne(note))
        .map(({ note, at }) => ({ text: lineOf(note, null), at: `${at.toFixed(2)} K` })),
    ]);
  };
  return [
    { title: "Not given", blocks: missing.map(({ path, text }) => `${path}: ${text}`) },
    {
      title: "Assumptions",
      blocks: [
        ...assumed.map((note) => lineOf(note, note.value)),
        `constants: ${constants}; fluxes in W m-2 of the area over which heat is spread`,
      ],
    },
    { title: "Cautions", blocks: lines(["caution", "invalid"]) },
    { title: "Notes", blocks: lines(["info"]) },
    {
      title: "Sources",
      blocks: [
        ...sources.map(({ of, source }) => `${of.join(", ")}: ${source}`),
        `computed with thermostead ${version}`,
      ],
    },
  ];
}

/** Writes notes: an input as it is written unless that is a word, a long time in days. */
const linesWith =
  ({ inputs }: Appraisal) =>
  ({ severity, about, unit, text }: Omit<Noted, "code">, value: number | null): string => {
    const own = inputs.find(
      (input) => input.path === about && input.value === value && /^[-+.\d]/.test(input.written),
    );
    const number = value === null ? "" : ` ${own?.written ?? numberOf(value, unit)}`;
    return `${severity === "invalid" ? "invalid: " : ""}${about}${number}: ${text}`;
  };

const DAY = 86400;
const MILLENNIUM = 1000 * YEAR;

function numberOf(value: number, unit: string): string {
  if (unit === "s" && value >= MILLENNIUM) return duration(value);
  return unit === "s" && value >= DAY ? withUnit(value / DAY, "d") : withUnit(value, unit);
}

/** The same note on several states is one note. */
function merged(notes: readonly { readonly text: string; readonly at: string | null }[]): string[] {
  const places = new Map<string, string[]>();
  for (const { text, at } of notes) places.set(text, [...(places.get(text) ?? []), ...(at ? [at] : [])]);
  return [...places].map(([text, at]) => (at.length === 0 ? text : `${text} (at ${at.join(", ")})`));
}
