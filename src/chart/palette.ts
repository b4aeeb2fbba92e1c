// The colours of all pictures, light and dark.

/** A colour by what it is for. */
export type Colour = "paper" | "ink" | "faint" | "warm" | "cool" | "green" | "purple";

/** Of a picture: `auto` is light, and turns dark where the reader's system asks for it. */
export type Theme = "auto" | "light" | "dark";

/** Hues of Okabe & Ito 2008 (Color Universal Design), which differ for every common kind of colour vision. */
const LIGHT: Readonly<Record<Colour, string>> = {
  paper: "#fff",
  faint: "#666",
  ink: "#1c1c1c",
  cool: "#0072b2",
  warm: "#d55e00",
  purple: "#cc79a7",
  green: "#009e73",
};

const DARK: typeof LIGHT = {
  ...LIGHT,
  paper: "#17191c",
  faint: "#aaa",
  ink: "#eee",
  cool: "#56b4e9",
  warm: "#e69f00",
};

/** Colours of lines that are one of many. */
export const HUES = Object.keys(LIGHT).slice(2) as Colour[];

/** The colours of a theme; those of `auto` are the light ones. */
export const paletteOf = (theme: Theme): typeof LIGHT => (theme === "dark" ? DARK : LIGHT);
