// All numbers of a result that have bounds beside them.
type Bounds = readonly [number, number] | null;

/** A number `x` with its `xRange`, and where it stands. */
export interface Ranged {
  readonly path: string;
  readonly value: number | null;
  readonly range: Bounds;
}

export function rangesIn(result: object, path = "feedbacks"): Ranged[] {
  return Object.entries(result).flatMap(([key, value]): Ranged[] => {
    if (key === "givens" || key === "notes") return [];
    const here = `${path}.${key}`;
    if (!key.endsWith("Range"))
      return Object(value) === value && !Array.isArray(value)
        ? rangesIn(value as object, here)
        : Array.isArray(value)
          ? value.flatMap((v, i) => (Object(v) === v ? rangesIn(v, `${here}[${i}]`) : []))
          : [];
    const name = key.slice(0, -"Range".length);
    const beside = (result as Record<string, number | null>)[name] as number | null;
    return [{ path: `${path}.${name}`, value: beside, range: value as Bounds }];
  });
}
