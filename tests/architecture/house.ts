// The rules of the house, checked over a set of source files (path from src → text); each fault is one line of text.
import path from "node:path";
import ts from "typescript";
import { doorFloor, floorOf, packageFloor, packages } from "./floors.ts";
import { importsOf, parse } from "./imports.ts";

export type Sources = ReadonlyMap<string, string>;

const coreDoor = "index.ts";
const isDoor = (file: string): boolean => !file.includes("/");
const roomOf = (file: string): string => file.slice(0, file.indexOf("/"));

/** Doors stand above every room. */
function floorOfFile(file: string): number | undefined {
  return isDoor(file) ? doorFloor : floorOf.get(roomOf(file));
}

function packageFault(file: string, specifier: string): string | null {
  const name = specifier.split("/")[0] ?? specifier;
  if (!packages.includes(name))
    return `imports "${specifier}", which is not among the packages of this library`;
  if ((floorOfFile(file) ?? 0) < packageFloor || file === coreDoor) {
    return `imports the package "${specifier}" below the floor where packages are allowed`;
  }
  return null;
}

function importFault(file: string, specifier: string, sources: Sources): string | null {
  if (!specifier.startsWith(".")) return packageFault(file, specifier);
  const target = path.posix.join(path.posix.dirname(file), specifier);
  if (!sources.has(target)) return `imports "${specifier}", which is not a file of src`;
  if (isDoor(target)) return `imports the door "${target}"; import the file that holds it`;
  if (isDoor(file)) {
    const tooHigh = file === coreDoor && (floorOfFile(target) ?? 0) >= packageFloor;
    return tooHigh ? `imports "${target}", whose floor may need packages` : null;
  }
  if (roomOf(target) === roomOf(file)) return null;
  const from = floorOfFile(file) ?? -1;
  const to = floorOfFile(target) ?? Number.POSITIVE_INFINITY;
  return to < from ? null : `imports "${target}", which is not on a lower floor`;
}

/** Imports that go up, sideways, to a door, to nothing or to a package that has no place there. */
export function importFaults(sources: Sources): string[] {
  return [...sources].flatMap(([file, text]) =>
    importsOf(parse(file, text)).flatMap(({ specifier, line }) => {
      const fault = importFault(file, specifier, sources);
      return fault === null ? [] : [`${file}:${line} ${fault}`];
    }),
  );
}

/** Files in a room that the table does not know, rooms with an index, doors that do more than re-export. */
export function placeFaults(sources: Sources): string[] {
  return [...sources].flatMap(([file, text]) => {
    if (!isDoor(file)) {
      if (floorOfFile(file) === undefined) return [`${file} is in a room that has no floor`];
      return path.posix.basename(file) === "index.ts" ? [`${file} is an index; import leaf files`] : [];
    }
    const reexports = parse(file, text).statements.every(
      (statement) => ts.isExportDeclaration(statement) && statement.moduleSpecifier !== undefined,
    );
    return reexports ? [] : [`${file} is a door and holds more than re-exports`];
  });
}

/** Every circle of imports, types included, as `a → b → a`. */
export function cycles(sources: Sources): string[] {
  const found: string[] = [];
  const done = new Set<string>();
  const trail: string[] = [];
  const visit = (file: string): void => {
    if (trail.includes(file)) {
      found.push([...trail.slice(trail.indexOf(file)), file].join(" → "));
      return;
    }
    if (done.has(file)) return;
    trail.push(file);
    for (const { specifier } of importsOf(parse(file, sources.get(file) ?? ""))) {
      if (specifier.startsWith(".")) visit(path.posix.join(path.posix.dirname(file), specifier));
    }
    trail.pop();
    done.add(file);
  };
  for (const file of sources.keys()) visit(file);
  return found;
}
