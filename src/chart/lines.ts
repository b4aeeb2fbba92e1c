// How much room text takes, without asking a browser: a little more than the fonts of common systems need.

/** Width of a usual letter, px. Letters of East Asian scripts are wide. */
const letterWidth = (text: string, size: number): number =>
  size * (/[\u2e80-\uffff]/.test(text) ? 1.05 : 0.62);

/** Estimated width of a text, px. */
export const textWidth = (text: string, size: number): number => text.length * letterWidth(text, size);

/** A text in lines that fit, broken at spaces where that can be, else before capitals, else anywhere. */
export function wrapped(text: string, width: number, size: number): string[] {
  const line = `\\S.{0,${Math.max(1, Math.floor(width / letterWidth(text, size)) - 1)}}`;
  return (text.match(new RegExp(`${line}(?=\\s|$)|${line}(?=\\p{Lu})|${line}`, "gu")) ?? []).map((part) =>
    part.trimEnd(),
  );
}

/** A text that fits, cut if it must be. */
export function clipped(text: string, width: number, size: number): string {
  const [line = "", ...more] = wrapped(text, width, size);
  return more.length > 0 ? `${line.slice(0, -1)}…` : line;
}
