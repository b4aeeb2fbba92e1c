// What the site consists of, in the order of its contents. A document in `docs` that is not named here stands with the subjects.
import fs from "node:fs";

/** Title of a group, and its entries: a document of the repository, or a page that is made in another way. */
const GROUPS = [
  ["Start", ["README.md", "docs/concepts.md", "docs/how-to.md", { file: "live.html", title: "Live page" }]],
  [
    "Subjects",
    ["docs/states.md", "docs/feedbacks.md", "docs/branches.md", "docs/planet.md", "docs/ledgers.md"],
  ],
  ["Reference", ["docs/laws.md", "docs/errors.md"]],
  [
    "Trust",
    [
      "docs/proof.md",
      "docs/elementary.md",
      "docs/limitations.md",
      "docs/validation.md",
      "docs/performance.md",
      "docs/decisions.md",
    ],
  ],
  ["Project", ["CHANGELOG.md", "DEVELOPERS.md"]],
];

/** Shorter than the documents' own titles. */
const TITLES = {
  "README.md": "The job",
  "docs/limitations.md": "Limitations",
  "docs/proof.md": "Proof",
  "DEVELOPERS.md": "For contributors",
};

/** Declarations that the pages of the reference show with their comments. */
const LEFT_OUT = ["docs/api-report.md"];

/** The name of a document's page. */
export const pageOf = (document) =>
  document === "README.md"
    ? "index.html"
    : `${document.replace("docs/", "").replace(".md", "").toLowerCase()}.html`;

const titleOf = (document) => /^# (.*)$/m.exec(fs.readFileSync(document, "utf8"))[1];

/** The groups of the contents: title and entries with `file`, `title`, and `document` where they have one. */
export function contentsOf(api) {
  const named = new Set([...GROUPS.flatMap(([, entries]) => entries), ...LEFT_OUT]);
  const rest = fs
    .readdirSync("docs")
    .map((name) => `docs/${name}`)
    .filter((document) => document.endsWith(".md") && !named.has(document));
  const more = { Subjects: rest, Reference: api.map(({ file, title }) => ({ file, title })) };
  return GROUPS.map(([title, entries]) => ({
    title,
    entries: [...entries, ...(more[title] ?? [])].flatMap(entryOf),
  }));
}

function entryOf(entry) {
  if (typeof entry !== "string") return [entry];
  const own = { file: pageOf(entry), title: TITLES[entry] ?? titleOf(entry), document: entry };
  if (entry !== "README.md") return [own];
  // the first steps are the examples of the README
  return [own, { file: `${own.file}#a-law-is-a-function`, title: "First steps" }];
}
