// Checks what is given of a published budget, and brings errors into one form.
import { fail } from "../ground/errors.ts";
import { checkedName, failUnknown } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { BOUNDLESS } from "../states/ledger.ts";
import { type PublishedBudget, type PublishedLedger, TOP } from "./published.ts";
import { fieldsOf, record, text } from "./written.ts";

/** A printed number with its error on each side. */
export interface Printed {
  readonly value: number;
  readonly error: Range | null;
  readonly lastDigit: number | null;
}

/** A published budget with every field checked. */
export interface ReadBudget {
  readonly source: string;
  readonly reservoirs: readonly string[];
  /** What is balanced: the top, if any flow comes from space, and the reservoirs inside. */
  readonly places: readonly string[];
  readonly flows: PublishedLedger["flows"];
  readonly storage: ReadonlyMap<string, Printed>;
}

const PATH = "publishedLedger";
const NUMBERS = ["value", "error", "range", "lastDigit"];
const ENDS = ["from", "to", "standardName"];
/** What a flow may be, and an error or a last digit, W m⁻². */
const FLOWS: Range = [-1e12, 1e12];
const SIZES: Range = [0, 1e12];

/** Throws the error of the first field that is wrong. */
export function readPublished(budget: PublishedBudget): ReadBudget {
  const given = fieldsOf(budget, PATH, ["source", "flows", "storage"]);
  const source = text(given.source, `${PATH}.source`);
  const flows = Object.entries(record(given.flows, `${PATH}.flows`)).map(([name, flow]) =>
    readFlow(name, flow),
  );
  if (flows.length === 0) {
    fail("bad-budget", { path: `${PATH}.flows`, value: "no flows", allowed: "at least one flow" });
  }
  const stored = given.storage === undefined ? {} : record(given.storage, `${PATH}.storage`);
  const names = [...new Set(flows.flatMap((flow) => [flow.from, flow.to]))];
  if (names.includes(TOP)) {
    fail("reserved-name", { path: `${PATH}.flows`, value: TOP, allowed: "any other name of a reservoir" });
  }
  const balanced = names.filter((name) => !BOUNDLESS.includes(name));
  const places = names.includes("space") ? [TOP, ...balanced] : balanced;
  const storage = Object.entries(stored).map(([place, value]): [string, Printed] => {
    const path = `${PATH}.storage.${place}`;
    if (!places.includes(place)) failUnknown(path, place, places);
    return [place, readPrinted(fieldsOf(value, path, NUMBERS), path)];
  });
  return { source, reservoirs: names, places, flows, storage: new Map(storage) };
}

function readFlow(name: string, flow: unknown): PublishedLedger["flows"][number] {
  const path = `${PATH}.flows.${checkedName(name, `${PATH}.flows`)}`;
  const fields = fieldsOf(flow, path, [...NUMBERS, ...ENDS]);
  const from = text(fields.from, `${path}.from`);
  const to = text(fields.to, `${path}.to`);
  if (from === to) {
    fail("bad-budget", { path, value: from, allowed: "a flow between two different reservoirs" });
  }
  const { standardName } = fields;
  const named = standardName === undefined ? null : checkedName(standardName, `${path}.standardName`);
  return { name, from, to, standardName: named, ...readPrinted(fields, path) };
}

function readPrinted(fields: Readonly<Record<string, unknown>>, path: string): Printed {
  const value = checkedNumber(fields.value, `${path}.value`, "W m-2", FLOWS);
  const lastDigit =
    fields.lastDigit === undefined
      ? null
      : checkedNumber(fields.lastDigit, `${path}.lastDigit`, "W m-2", SIZES);
  return { value, error: readError(fields, value, path), lastDigit };
}

function readError(
  { error, range }: Readonly<Record<string, unknown>>,
  value: number,
  path: string,
): Range | null {
  if (error !== undefined && range !== undefined) {
    return fail("contradiction", { path, value: "error and range", allowed: "one of the two" });
  }
  if (error !== undefined) {
    const size = checkedNumber(error, `${path}.error`, "W m-2", SIZES);
    return [size, size];
  }
  if (range === undefined) return null;
  const [low, high] = checkedRange(range, `${path}.range`, "W m-2", FLOWS);
  checkedNumber(value, `${path}.value`, "W m-2", [low, high]);
  return [value - low, high - value];
}
