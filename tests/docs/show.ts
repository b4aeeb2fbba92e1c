// Writes a value as the examples show it: numbers with seven digits, on one line where it fits.

const WIDTH = 96;

export function show(value: unknown, room = WIDTH): string {
  if (typeof value === "number") return Object.is(value, -0) ? "-0" : String(Number(value.toPrecision(7)));
  if (typeof value === "string") return JSON.stringify(value);
  if (typeof value === "function") return `function ${value.name}`;
  if (typeof value !== "object" || value === null) return String(value);
  if (value instanceof Error) return `${value.name}: ${value.message}`;
  const list = Array.isArray(value);
  const parts = list
    ? value.map((part): [string, unknown] => ["", part])
    : Object.entries(value).map(([key, part]): [string, unknown] => [`${keyOf(key)}: `, part]);
  if (parts.length === 0) return list ? "[]" : "{}";
  const short = parts.map(([key, part]) => key + show(part, Number.POSITIVE_INFINITY)).join(", ");
  if (short.length + 4 <= room) return list ? `[${short}]` : `{ ${short} }`;
  const lines = parts.map(([key, part]) => `  ${key}${indented(show(part, room - 2 - key.length))},`);
  return [list ? "[" : "{", ...lines, list ? "]" : "}"].join("\n");
}

const keyOf = (key: string): string => (/^[A-Za-z_]\w*$/.test(key) ? key : JSON.stringify(key));
const indented = (text: string): string => text.replaceAll("\n", "\n  ");
