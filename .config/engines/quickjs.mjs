// Runs a program in QuickJS, compiled to WebAssembly: `node .config/engines/quickjs.mjs FILE`.
import fs from "node:fs";
import { getQuickJS } from "quickjs-emscripten";

const context = (await getQuickJS()).newContext();
const print = context.newFunction("print", (text) => {
  console.log(context.getString(text));
});
context.setProp(context.global, "print", print);
print.dispose();
const program = fs.readFileSync(process.argv[2], "utf8");
context.unwrapResult(context.evalCode(program, "program.mjs", { type: "module" })).dispose();
