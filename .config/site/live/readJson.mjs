// Reads JSON and remembers where everything stands, so that an error can be shown at its place. What it refuses,
// `JSON.parse` refuses too; and it refuses a field that is there twice.

/** What is wrong with a text, and where. */
export class JsonProblem extends Error {
  constructor(at, message) {
    super(message);
    this.at = at;
  }
}

const SPACE = /[ \t\n\r]*/y;
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const TEXT = /"(?:[^"\\\n]|\\.)*"/y;
const WORD = /true|false|null/y;
const DEEPEST = 100;

/**
 * `{ value, places }`: the value, and for each path, written as the library writes it (`albedo.covers[0].share`), where its
 * field begins. The whole has the path "". Throws a `JsonProblem`.
 */
export function readJson(text) {
  const places = new Map();
  let at = 0;

  const taken = (pattern) => {
    pattern.lastIndex = at;
    const found = pattern.exec(text)?.[0];
    if (found !== undefined) at += found.length;
    return found;
  };
  const next = () => {
    taken(SPACE);
    return text[at];
  };
  const refuse = (wanted, place = at) => {
    const found =
      text
        .slice(place, place + 20)
        .split("\n")[0]
        .trim() || "the end";
    throw new JsonProblem(place, `not JSON here: ${wanted} wanted, found ${found}`);
  };

  function textValue(what) {
    const start = at;
    const found = taken(TEXT) ?? refuse(what);
    try {
      return JSON.parse(found);
    } catch {
      return refuse("a text without control characters and with known escapes", start);
    }
  }

  function value(path, depth) {
    if (depth > DEEPEST) throw new JsonProblem(at, "nested too deeply");
    const first = next();
    if (!places.has(path)) places.set(path, at);
    if (first === "{") return record(path, depth);
    if (first === "[") return list(path, depth);
    if (first === '"') return textValue("a text");
    const word = taken(WORD) ?? taken(NUMBER);
    return word === undefined ? refuse("a value") : JSON.parse(word);
  }

  /** Reads what stands between two brackets, part by part. */
  function parts(close, part) {
    at++;
    if (next() === close) return at++;
    for (let i = 0; ; i++) {
      part(i);
      const after = at;
      const end = next();
      // a comma is missing where the value before it ends, not where the next one begins
      if (end !== close && end !== ",")
        throw new JsonProblem(after, `not JSON here: "," or "${close}" wanted`);
      at++;
      if (end === close) return at;
    }
  }

  function record(path, depth) {
    const fields = new Map();
    parts("}", () => {
      next();
      const start = at;
      const key = textValue("a field's name in quotes");
      const own = path === "" ? key : `${path}.${key}`;
      if (fields.has(key)) throw new JsonProblem(start, `the field ${key} is there twice`);
      if (!places.has(own)) places.set(own, start);
      if (next() !== ":") refuse('":"');
      at++;
      fields.set(key, value(own, depth + 1));
    });
    return Object.fromEntries(fields);
  }

  function list(path, depth) {
    const items = [];
    parts("]", (i) => items.push(value(`${path}[${i}]`, depth + 1)));
    return items;
  }

  const whole = value("", 0);
  if (next() !== undefined) refuse("nothing more");
  return { value: whole, places };
}

/** Where the field of a path stands, or the nearest that holds it. */
export function placeOf(path, places) {
  for (let part = path; part !== ""; part = part.replace(/(^|\.)[^.[]*$|\[\d+\]$/, "")) {
    if (places.has(part)) return places.get(part);
    if (!/[.[]/.test(part)) break;
  }
  return places.get("") ?? 0;
}
