// What the bench reads below the doors: the kernels behind a loop.
export * from "../src/index.ts";
export { inputsOf } from "../src/loop/inputs.ts";
export { allowGeneration } from "../src/reading/generation.ts";
export { slopeNodes } from "../src/reading/slopeKernel.ts";
export { valueKernel } from "../src/reading/valueKernel.ts";
export { enclosedBalance } from "../src/states/enclosedBalance.ts";
