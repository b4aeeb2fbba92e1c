// Makes docs/validation.md: every comparison with the outside, with its source.
import type { Check } from "./check.ts";
import { rows, subjects } from "./rows.ts";

/** Ours is shown with eight digits, or with as many as the published number has, up to twelve. */
const digitsOf = (published: number): number => {
  const [digits = ""] = Math.abs(published).toExponential().split("e");
  return Math.min(12, Math.max(8, digits.replace(".", "").length));
};
const shown = (value: number, digits: number): string => String(Number(value.toPrecision(digits)));
const brief = (value: number): string => (value === 0 ? "0" : value.toExponential(1).replace("+", ""));

/** A difference below rounding is said in words, so that the document stays as it is when an operation is reordered. */
function difference({ ours, published }: Check): string {
  const by = ours() - published;
  return by !== 0 && Math.abs(by) <= 1e-10 * Math.abs(published) ? "rounding" : brief(by);
}

function table(checks: readonly Check[], numberOf: (check: Check) => number): string {
  const head = ["what", "published", "ours", "difference", "tolerance", "unit", "source", "basis", "through"];
  const lines = checks.map((check) => {
    const digits = digitsOf(check.published);
    return [
      check.what,
      shown(check.published, digits),
      shown(check.ours(), digits),
      difference(check),
      brief(check.tolerance),
      check.unit,
      `[${numberOf(check)}]`,
      check.basis,
      check.covers.join(", "),
    ].join(" | ");
  });
  return [head.join(" | "), head.map(() => "---").join(" | "), ...lines]
    .map((line) => `| ${line} |`)
    .join("\n");
}

const counted = (basis: string): number => rows.filter((row) => row.basis === basis).length;

/** The whole document. */
export default function validation(): string {
  const sources = [...new Set(rows.map((row) => row.source))];
  const numberOf = (check: Check) => sources.indexOf(check.source) + 1;
  const reasons = [...new Set(rows.map((row) => row.because))].map((reason) => `- ${reason}`);
  const sections = Object.entries(subjects).map(
    ([name, checks]) => `## ${name}\n\n${table(checks, numberOf)}`,
  );
  const list = sources.map(
    ({ authors, year, title, where }, i) => `${i + 1}. ${authors} (${year}): ${title}; ${where}.`,
  );
  return `# Validation

${rows.length} numbers of this library beside numbers from ${sources.length} sources outside it. \`npm test\` fails when one of
them differs by more than its tolerance, or when an exported law or constant is missing. The equilibria of whole budgets
are compared state by state with tables of 24 digits in \`tests/tables\`.

*Basis*: "seen" was read in the source; "from memory" is what we remember of it, to be checked against the page before it
is cited; "computed with …" is the source's formula evaluated by a script of \`tests/reference/scripts\` that does not read
this library. *Rounding*: the difference is below 10⁻¹⁰ of the number. Of the numbers, ${counted("seen")} were seen,
${counted("from memory")} are from memory, and the others are computed.

${sections.join("\n\n")}

## Where the tolerances come from

${reasons.join("\n")}

## Sources

${list.join("\n")}
`;
}
