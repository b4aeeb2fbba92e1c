// Runs a program of a document against the package as built, by the package's own names.
import ts from "typescript";
import { type Claim, reporting } from "./claims.ts";
import type { Program } from "./programs.ts";
import { show } from "./show.ts";

/** What a claim says and what the program gave. */
export interface Outcome {
  readonly claim: Claim;
  readonly found: string;
}

type Show = (index: number, value: () => unknown) => Promise<void>;
type Load = (specifier: string) => Promise<unknown>;

const AsyncFunction = Object.getPrototypeOf(async () => {}).constructor as new (
  ...parts: string[]
) => (load: Load, show: Show) => Promise<void>;

export async function runProgram({ fences }: Program): Promise<Outcome[]> {
  const claims: Claim[] = [];
  const codes = fences.map((fence) => {
    const part = reporting(fence, claims.length);
    claims.push(...part.claims);
    return part.code;
  });
  const found = new Map<number, string>();
  const record: Show = async (index, value) => {
    found.set(index, await shown(value));
  };
  const load: Load = (specifier) => import(/* @vite-ignore */ specifier);
  await new AsyncFunction("load", "reports", plainCode(codes.join("\n")))(load, record);
  return claims.map((claim, index) => ({ claim, found: found.get(index) ?? "nothing" }));
}

/** A call that throws shows its error. */
async function shown(value: () => unknown): Promise<string> {
  try {
    return show(await value());
  } catch (error) {
    return show(error);
  }
}

/** The code without its types, still the body of an async function. */
function plainCode(code: string): string {
  const target = ts.ScriptTarget.ES2022;
  return ts.transpileModule(code, { compilerOptions: { target, module: ts.ModuleKind.ESNext } }).outputText;
}
