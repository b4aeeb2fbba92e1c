// The reference: one page for each door, from the doc comments of what it exports.
import path from "node:path";
import { pathToFileURL } from "node:url";
import ts from "typescript";
import { doors, specifierOf } from "../doors.mjs";
import { exportsOf } from "./exportsOf.mjs";
import { coded, htmlOf } from "./markdown.mjs";
import { kindOf, signatureOf } from "./signature.mjs";

/** Rooms of sources as sections, in the order in which one meets them; a room without a title has its own name. */
const ROOMS = {
  loop: "Loops",
  states: "States",
  feedback: "Feedbacks",
  branches: "Branches and folds",
  ledger: "Ledgers",
  law: "Making laws",
  graph: "Operations and quantities",
  planet: "Descriptions",
  appraisal: "Appraisals",
  chart: "Pictures",
  star: "Laws of starlight",
  orbit: "Laws of orbits",
  albedo: "Laws of albedo",
  greenhouse: "Laws of emission",
  heat: "Laws of heat capacity",
  forcing: "Laws of forcing",
  water: "Laws of water and frost",
  habitable: "Laws of the habitable zone",
  biosphere: "Laws of plants",
  ground: "Errors, ranges and constants",
};

const fileOf = (door) => `api-${specifierOf(door).replace("/", "-")}.html`;

export async function apiPages() {
  const all = new Map(doors.map((door) => [door, exportsOf(door)]));
  const built = (door) => import(pathToFileURL(path.resolve("dist", `${door}.js`)).href);
  const { ERROR_CODES } = await built("index");
  return Promise.all(
    doors.map(async (door) => {
      const codeLink = linker(door, all, ERROR_CODES);
      return doorPage(door, { entries: all.get(door), values: await built(door), codeLink });
    }),
  );
}

/** Words of code that are names of exports lead to them, to the door's own first; codes of errors to what they mean. */
function linker(own, all, codes) {
  const doorsOf = [own, ...doors.filter((door) => door !== own)];
  return (words) => {
    if (codes.includes(words)) return `errors.html#${words}`;
    const door = doorsOf.find((name) => all.get(name).some((entry) => entry.name === words));
    return door && `${door === own ? "" : fileOf(door)}#${words}`;
  };
}

function doorPage(door, { entries, values, codeLink }) {
  const specifier = specifierOf(door);
  const roomOf = ({ file }) => file.split("/")[1];
  const rooms = [...new Set([...Object.keys(ROOMS), ...entries.map(roomOf)])];
  const sections = rooms.flatMap((room) => {
    const own = entries.filter((entry) => roomOf(entry) === room);
    if (own.length === 0) return [];
    const keyOf = ({ name }) => `${name in values ? 0 : 1}${name.toLowerCase()}`;
    const sorted = own.sort((a, b) => (keyOf(a) < keyOf(b) ? -1 : 1)); // types come last
    return [{ slug: `room-${room}`, text: ROOMS[room] ?? room, entries: sorted }];
  });
  const contents = sections.map(({ slug, text, entries }) => {
    const links = entries.map(({ name }) => `<a href="#${name}"><code>${name}</code></a>`).join(" ");
    return `<dt><a href="#${slug}">${text}</a></dt><dd>${links}</dd>`;
  });
  const body = sections.map(({ slug, text, entries }) => {
    const parts = entries.map((entry) => section(entry, values[entry.name], codeLink));
    return `<h2 id="${slug}">${text}</h2>\n${parts.join("")}`;
  });
  return {
    file: fileOf(door),
    title: specifier,
    headings: sections.map(({ slug, text }) => ({ depth: 2, slug, text })),
    body: `<h1>${specifier}</h1>
<p>What <code>import { … } from "${specifier}"</code> offers, in the words of its sources.</p>
<dl class="names">${contents.join("\n")}</dl>
${body.join("\n")}`,
  };
}

function section(entry, value, codeLink) {
  const { name, file, nodes } = entry;
  const kind = kindOf(entry, value);
  const comment = nodes.map(commentOf).find((text) => text !== "");
  if (!comment) throw new Error(`${file}: ${name} is exported and has no doc comment`);
  const { html } = htmlOf(comment, { link: (href) => href, codeLink });
  const inLaws = kind === "law" ? ` · <a href="laws.html#${name.toLowerCase()}">formula and ports</a>` : "";
  const line = ts.getLineAndCharacterOfPosition(nodes[0].getSourceFile(), nodes[0].getStart()).line + 1;
  return `<section class="entry" aria-labelledby="${name}">
<h3 id="${name}"><code>${name}</code> <span class="kind">${kind}</span></h3>
<pre tabindex="0"><code>${coded(signatureOf(entry, value))}</code></pre>
${html}<p class="source">${file}:${line}${inLaws}</p>
</section>
`;
}

/** A doc comment as Markdown; examples become code. */
function commentOf(node) {
  const written = (part) =>
    (ts.getTextOfJSDocComment(part.comment) ?? "").replace(/\{@link (\w+)\}/g, "`$1`");
  return ts
    .getJSDocCommentsAndTags(node)
    .filter(ts.isJSDoc)
    .flatMap((comment) => {
      const examples = (comment.tags ?? []).filter((tag) => tag.tagName.text === "example");
      return [written(comment), ...examples.map((tag) => `\`\`\`ts\n${written(tag)}\n\`\`\``)];
    })
    .join("\n\n")
    .trim();
}
