// The enclosed balance of a loop, made once.

import { kept } from "../loop/kept.ts";
import { type EnclosedBalance, enclosedBalance } from "../states/enclosedBalance.ts";

/** N and its kinks over temperature; whoever reads them sets the givens first. */
export const balanceOf = /* @__PURE__ */ kept<EnclosedBalance>((loop) => enclosedBalance(loop));
