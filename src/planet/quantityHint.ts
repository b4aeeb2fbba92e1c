// What to write in place of a text that is almost a number with its unit.

const ALMOST = /^\s*([-+\u2212]?)\s*(\d*[.,]?\d+(?:[eE][-+]?\d{1,3})?)\s*(\u00b0C|[A-Za-z].*?)\s*$/u;

/** `; write "1.5 au"` for `"1,5 au"` or `"1.5au"`; nothing where it is not clear what is meant. */
export function quantityHint(text: string): string {
  const [, sign, number, unit] = (text.length <= 100 && ALMOST.exec(text)) || [];
  // a comma before three digits may stand between thousands
  if (number === undefined || unit === undefined || /,\d{3}\b/.test(number)) return "";
  const value = `${sign === "\u2212" ? "-" : sign}${number.replace(",", ".")}`;
  return `; write "${value} ${unit === "°C" ? "degC" : unit}"`;
}
