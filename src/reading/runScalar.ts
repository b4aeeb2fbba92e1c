// Makes a program of scalar steps run.
import { generateScalar } from "./generateScalar.ts";
import { mayGenerate } from "./generation.ts";
import { interpretScalar } from "./interpretScalar.ts";
import type { RunOf, ScalarKernel } from "./scalarProgram.ts";

/** As generated code where the host allows it, else by the interpreter: the same bits. */
export const runScalar = (run: RunOf): ScalarKernel =>
  (mayGenerate() ? generateScalar : interpretScalar)(run);
