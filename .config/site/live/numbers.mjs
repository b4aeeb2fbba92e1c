// Numbers for reading.

const DAY = 86400;
const YEAR = 365.25 * DAY;

/** Four digits, with a real minus sign; a dash where there is no number. */
export function number(value) {
  if (!Number.isFinite(value)) return "–";
  return String(Number(value.toPrecision(4))).replace(/^-/, "−");
}

/** Seconds in the unit that suits them. */
export function duration(seconds) {
  if (seconds === null) return "–";
  if (seconds >= YEAR) return `${number(seconds / YEAR)} years`;
  return seconds >= DAY ? `${number(seconds / DAY)} days` : `${number(seconds / 3600)} hours`;
}
