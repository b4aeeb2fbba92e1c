// The enclosed balance of a loop, made once.
import { type EnclosedBalance, enclosedBalance } from "../states/enclosedBalance.ts";
import { kept } from "./kept.ts";

/** N and its kinks over temperature; whoever reads them sets the givens first. */
export const balanceOf = /* @__PURE__ */ kept<EnclosedBalance>((loop) => enclosedBalance(loop));
