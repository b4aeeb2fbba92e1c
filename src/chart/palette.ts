// The colours of all pictures, light and dark.

/** A colour by what it is for. */
export type Colour = "paper" | "ink" | "faint" | "warm" | "cool" | "green" | "purple";

/** Of a picture: `auto` is light, and turns dark where the reader's system asks for it. */
export type Theme = "auto" | "light" | "dark";

/** Hues of Okabe & Ito 2008 (Color Universal Design), which differ for every common kind of colour vision. */
const LIGHT: Readonly<Record<Colour, string>> = {
  paper: "#fff",
  ink: "#1c1c1c",
  faint: "#666",
  warm: "#d55e00",
  cool: "#0072b2",
  green: "#009e73",
  purple: "#cc79a7",
};

const DARK: typeof LIGHT = {
  ...LIGHT,
  paper: "#17191c",
  ink: "#eee",
  faint: "#aaa",
  warm: "#e69f00",
  cool: "#56b4e9",
};

/** The colours of a theme; those of `auto` are the light ones. */
export const paletteOf = (theme: Theme): typeof LIGHT => (theme === "dark" ? DARK : LIGHT);
