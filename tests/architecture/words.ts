// Finds what has no place in a text of the project: the workplace it was made at, hosts, work left for later.

// Written so that this list does not find itself.
const unwanted = [
  /\btranscrip[t]s?\b/i,
  /\bseed documen[t]/i,
  /\blectur[e]s?\b/i,
  /(?<!\bof )\bcours[e]s?\b/i,
  /\bsessio[n]s?\b/i,
  /\bagen[t]s?\b/i,
  /\/(wor[k]|tm[p]|roo[t]|far[m])\//,
  /\.\.\/share[d]/,
  /\bregistr[y]\.|\.npmj[s]\.|deb\.debia[n]/,
  /\b(TOD[O]|FIXM[E]|XX[X]|HAC[K])\b/,
  /\.(onl[y]|ski[p])\(/,
  /@ts-(ignor[e]|nochec[k])|(eslint|biome)-(disabl[e]|ignor[e])/,
];

export function wordFaults(file: string, text: string): string[] {
  return text.split("\n").flatMap((line, index) =>
    unwanted.flatMap((pattern) => {
      const match = pattern.exec(line);
      return match ? [`${file}:${index + 1} has "${match[0]}"`] : [];
    }),
  );
}
