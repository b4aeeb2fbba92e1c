// What to write in place of a text where a pure number is wanted.

const SHARES: Readonly<Record<string, string>> = {
  "": "",
  "1": "",
  "%": "",
  ppm: "e-6",
  ppmv: "e-6",
  ppb: "e-9",
  ppbv: "e-9",
};
const WRITTEN = /^\s*([-+]?(?:\d+\.?\d*|\.\d+))\s*(|1|%|ppmv?|ppbv?)\s*$/;

/** `; write 420e-6` for `"420 ppm"`; nothing for a text that is no such number. */
export function pureHint(value: unknown): string {
  const [, number, unit] = (typeof value === "string" && value.length < 100 && WRITTEN.exec(value)) || [];
  if (number === undefined || unit === undefined) return "";
  // a percentage is a plain decimal, smaller shares keep their digits
  const plain =
    unit === "%" ? String(Number((Number(number) / 100).toPrecision(15))) : `${number}${SHARES[unit]}`;
  return `; write ${plain}, without quotes`;
}
