// What every page has around its own content: policy, contents, foot.
import fs from "node:fs";
import { escaped } from "./markdown.mjs";

/** Nothing but files of the site: no code in the page, no request to anywhere. */
export const POLICY =
  "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:; base-uri 'none'; form-action 'none'";

/** What the script of the live page contains besides the library. */
const LICENCES = ' · <a href="assets/licences.txt">licences of packages in this page</a>';

/** A page as text. `page`: file, title, body, headings, and whether it is `live`. */
export function whole(page, contents) {
  const { version } = JSON.parse(fs.readFileSync("package.json", "utf8"));
  const { file, title, body, live = false } = page;
  const name = file === "index.html" ? "thermostead" : `${title} · thermostead`;
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${POLICY}">
<meta name="referrer" content="no-referrer">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<title>${escaped(name)}</title>
<link rel="icon" href="assets/icon.svg">
<link rel="stylesheet" href="assets/site.css">
${live ? '<link rel="stylesheet" href="assets/live.css">\n<script src="assets/live.js" defer></script>\n' : ""}</head>
<body${live ? ' class="live"' : ""}>
<a class="skip" href="#content">To the content</a>
<header>
<a class="home" href="index.html">thermostead</a>
<a href="live.html"${live ? ' aria-current="page"' : ""}>Live page</a>
<a href="laws.html">Laws</a>
<a class="to-contents" href="#contents">Contents</a>
</header>
<main id="content" tabindex="-1">
${body}</main>
<nav id="contents" aria-label="Contents">
${contents.map((group) => groupOf(group, page)).join("\n")}
</nav>
<footer>thermostead ${version} · screening estimates, no projections · MIT licence${live ? LICENCES : ""}</footer>
</body>
</html>
`;
}

function groupOf({ title, entries }, page) {
  const items = entries.map((entry) => {
    const here = entry.file === page.file;
    const link = `<a href="${entry.file}"${here ? ' aria-current="page"' : ""}>${escaped(entry.title)}</a>`;
    return `<li>${link}${here ? sectionsOf(page) : ""}</li>`;
  });
  return `<div>\n<h2>${title}</h2>\n<ul>\n${items.join("\n")}\n</ul>\n</div>`;
}

/** The sections of the page one is on. */
function sectionsOf({ headings = [] }) {
  const sections = headings.filter(({ depth }) => depth === 2);
  if (sections.length < 2) return "";
  return `<ul>${sections.map(({ slug, text }) => `<li><a href="#${slug}">${escaped(text)}</a></li>`).join("")}</ul>`;
}
