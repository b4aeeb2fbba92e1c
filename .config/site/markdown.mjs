// Markdown of the repository as HTML of the site.
import katex from "katex";
import { Marked } from "marked";

export const escaped = (text) =>
  String(text).replace(
    /[&<>"]/g,
    (letter) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" })[letter],
  );

/** The name by which a heading is linked to. */
export const slugOf = (heading) =>
  heading
    .toLowerCase()
    .replace(/[^\p{L}\p{N} _-]/gu, "")
    .replaceAll(" ", "-");

const plain = (text) => text.replace(/[`*]/g, "");

/** Code as HTML. Comments are fainter: in examples they are what was printed. */
export const coded = (text) =>
  escaped(text).replace(/(^|\s)(\/\/ [^\n]*$|\/\*\*.*?\*\/)/gms, '$1<span class="said">$2</span>');

/** Something wide scrolls in its own box, which the keyboard reaches too. */
const scrolling = (inside, label) =>
  `<div class="wide" role="region" aria-label="${label}" tabindex="0">${inside}</div>\n`;

/** TeX as MathML, which browsers draw by themselves. */
const mathOf = (tex) => katex.renderToString(tex, { output: "mathml", displayMode: true, strict: "error" });

/**
 * The HTML of a text and its headings, as `{ html, headings: [{ depth, text, slug }] }`.
 * `link` turns what a link says into where it leads on the site; `codeLink` may do so for words of code.
 */
export function htmlOf(text, { link, codeLink = () => undefined }) {
  const headings = [];
  const slugs = new Map();
  const renderer = {
    heading({ tokens, depth, text: words }) {
      const base = slugOf(plain(words));
      const before = slugs.get(base) ?? 0;
      slugs.set(base, before + 1);
      const slug = before === 0 ? base : `${base}-${before}`;
      headings.push({ depth, text: plain(words), slug });
      return `<h${depth} id="${slug}">${this.parser.parseInline(tokens)}</h${depth}>\n`;
    },
    link({ href, tokens }) {
      return `<a href="${escaped(link(href))}">${this.parser.parseInline(tokens)}</a>`;
    },
    codespan({ text: words }) {
      const target = codeLink(words);
      const code = `<code>${escaped(words)}</code>`;
      return target ? `<a href="${target}">${code}</a>` : code;
    },
    code({ text: words, lang = "" }) {
      if (lang === "math") return scrolling(mathOf(words), "Formula");
      const body = /^[tj]s\b/.test(lang) ? coded(words) : escaped(words);
      return `<pre tabindex="0"><code>${body}</code></pre>\n`;
    },
    table({ header, rows, align }) {
      const cell = (tag) => (token, i) => {
        const right = align[i] === "right" ? ' class="number"' : "";
        return `<${tag}${right}>${this.parser.parseInline(token.tokens)}</${tag}>`;
      };
      const row = (cells, tag) => `<tr>${cells.map(cell(tag)).join("")}</tr>\n`;
      const body = rows.map((cells) => row(cells, "td")).join("");
      return scrolling(`<table><thead>${row(header, "th")}</thead><tbody>${body}</tbody></table>`, "Table");
    },
    html: ({ text: words }) => escaped(words),
  };
  const html = new Marked({ renderer }).parse(text);
  return { html, headings };
}
