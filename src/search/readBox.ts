// Reads a whole box at once.
import type { Piece, Reader } from "./reader.ts";

/** Value, slope and curvature over a box; of a function that `endsOf` made, which needs nothing of its ends but where they are. */
export function readBox(reader: Reader, a: number, b: number): Piece {
  const left = reader.take();
  const right = reader.take();
  left.x = a;
  right.x = b;
  reader.between(left, right);
  reader.give(left);
  reader.give(right);
  return reader.bend();
}
