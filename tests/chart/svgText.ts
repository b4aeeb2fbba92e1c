// What a test needs of an SVG: whether it is well-formed, its elements, and where its words stand.

export interface Element {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly inside: Element[];
  text: string;
}

const TOKEN = /<(\/?)([\w:]+)((?:\s+[\w:-]+="[^"<]*")*)\s*(\/?)>|([^<]+)/gy;

/** Reads XML strictly; throws where it is not well-formed. */
export function parsed(xml: string): Element {
  const root: Element = { name: "", attributes: {}, inside: [], text: "" };
  const open = [root];
  let end = 0;
  for (const match of xml.matchAll(TOKEN)) {
    end = match.index + match[0].length;
    const [, closing, name = "", written = "", , text] = match;
    const parent = open.at(-1) as Element;
    if (text !== undefined) parent.text += decoded(text);
    else if (closing) {
      if (open.pop()?.name !== name) throw new Error(`</${name}> closes another element`);
    } else {
      const pairs = [...written.matchAll(/([\w:-]+)="([^"]*)"/g)].map(([, key, value]) => [
        key,
        decoded(value ?? ""),
      ]);
      if (new Set(pairs.map(([key]) => key)).size < pairs.length)
        throw new Error(`<${name}> repeats an attribute`);
      const element = { name, attributes: Object.fromEntries(pairs), inside: [], text: "" };
      parent.inside.push(element);
      open.push(element);
    }
  }
  if (end < xml.length || open.length > 1)
    throw new Error(`not well-formed after ${xml.slice(0, end).slice(-80)}`);
  return root.inside[0] as Element;
}

function decoded(text: string): string {
  if (/&(?!#\d+;)/.test(text)) throw new Error(`a bare & in ${text}`);
  if (/(?!\n)\p{Cc}|\p{Cs}|[\ufffe\uffff]/u.test(text)) throw new Error("a letter that XML cannot hold");
  return text.replace(/&#(\d+);/g, (_, code) => String.fromCodePoint(Number(code)));
}

/** All elements of a name, at any depth. */
export const all = (element: Element, name: string): Element[] =>
  element.inside.flatMap((e) => [...(e.name === name ? [e] : []), ...all(e, name)]);

export interface Words {
  readonly text: string;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly fill: string | undefined;
}

/**
 * Where words stand in their picture, for letters of 0.58 em: a common width of system fonts. Size, anchor and colour are
 * those of the text or of the nearest element around it that has them.
 */
export function wordsOf(svg: Element): Words[] {
  const words: Words[] = [];
  const [originX = 0, originY = 0] = (svg.attributes.viewBox ?? "").split(" ").map(Number);
  const walk = (element: Element, around: Element["attributes"]): void => {
    const known = { ...around, ...element.attributes };
    if (element.name === "text" && element.text.trim() !== "") {
      const size = Number(known["font-size"]);
      const width = [...element.text].length * 0.58 * size;
      const [x, y] = [Number(element.attributes.x) - originX, Number(element.attributes.y) - originY];
      const anchor = known["text-anchor"];
      const left = anchor === "end" ? x - width : anchor === "middle" ? x - width / 2 : x;
      words.push({
        text: element.text,
        left,
        right: left + width,
        top: y - 0.75 * size,
        bottom: y + 0.1 * size,
        fill: known.fill,
      });
    }
    for (const inner of element.inside) walk(inner, known);
  };
  walk(svg, {});
  return words;
}

/** Pairs of words that lie on one another. */
export function overlapping(words: readonly Words[]): string[] {
  return words.flatMap((a, i) =>
    words
      .slice(i + 1)
      .filter((b) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom)
      .map((b) => `${a.text} | ${b.text}`),
  );
}
