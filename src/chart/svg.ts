// The text of an SVG, element by element.
import { escaped } from "./wording.ts";

type Attributes = Readonly<Record<string, unknown>>;

/**
 * An element. Attributes may have the names that Vega-Lite gives them; `tip` is what is said when it is pointed at.
 */
export function el(name: string, { tip, ...attributes }: Attributes, inside = ""): string {
  const written = Object.entries(attributes).map(([key, value]) => {
    const kebab = key.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`).replace("dash", "dasharray");
    return ` ${kebab}="${escaped(typeof value === "number" ? tenth(value) : value)}"`;
  });
  return `<${name}${written.join("")}>${tip ? `<title>${escaped(tip)}</title>` : ""}${inside}</${name}>`;
}

/** A tenth of a pixel is as exact as a picture needs. */
export const tenth = (value: number): number => Math.round(value * 10) / 10;
