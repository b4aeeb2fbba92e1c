// The manual: documents of the repository as pages. Links between documents become links between pages; other files that
// a document links to come along.
import fs from "node:fs";
import path from "node:path";
import { htmlOf } from "./markdown.mjs";

/** The pages, and the files to be copied as a map from the name on the site to the name in the repository. */
export function manualPages(contents) {
  const entries = contents.flatMap((group) => group.entries).filter((entry) => entry.document);
  const pageOf = new Map(entries.map(({ document, file }) => [document, file]));
  const titleOf = new Map(entries.map(({ document, title }) => [document, title]));
  const files = new Map();

  const linkIn = (document) => (href) => {
    if (/^([a-z]+:|#)/.test(href)) return href;
    const [target, section] = href.split("#");
    const goal = path.posix.join(path.posix.dirname(document), target);
    const tail = section === undefined ? "" : `#${section}`;
    const page = pageOf.get(goal);
    if (page) return page + tail;
    if (!fs.existsSync(goal)) throw new Error(`${document} links to ${href}, which is not there`);
    const copy = `files/${goal}${path.extname(goal) === "" ? ".txt" : ""}`;
    files.set(copy, goal);
    return copy + tail;
  };

  const pages = entries.map(({ document, file, title }) => {
    // in the repository a document is called by its file's name, here by its title
    const named = (words) => titleOf.get(path.posix.join(path.posix.dirname(document), words)) ?? words;
    const text = fs
      .readFileSync(document, "utf8")
      .replace(/\[([\w./-]+\.md)\]\(/g, (_, words) => `[${named(words)}](`);
    const { html, headings } = htmlOf(text, { link: linkIn(document) });
    return { file, title, body: html, headings };
  });
  return { pages, files };
}
