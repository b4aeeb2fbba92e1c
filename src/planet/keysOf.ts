// The keys of a path.

/** `albedo.covers[0].share` → `["albedo", "covers", 0, "share"]`; none for the description as a whole. */
export const keysOf = (path: string): (string | number)[] =>
  path === "description"
    ? []
    : (path.match(/[^.[\]]+/g) ?? []).map((key) => (/^\d+$/.test(key) ? Number(key) : key));
