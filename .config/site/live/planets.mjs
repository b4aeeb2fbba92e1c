// The planets to begin with. All are invented.
import doubleSun from "./planets/ilvarre.json";
import warm from "./planets/orsolne.json";
import covers from "./planets/quenth.json";
import incomplete from "./planets/sabbeln.json";
import runaway from "./planets/tamrith.json";

/** Descriptions as texts, by what a reader chooses from. */
export const PLANETS = {
  "Orsolne: three states, ice or not": warm,
  "Quenth: sea, ice and clouds": covers,
  "Tamrith: vapour near its limit": runaway,
  "Ilvarre: two stars": doubleSun,
  "Sabbeln: no budget yet": incomplete,
};
