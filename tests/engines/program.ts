// What every engine runs: one file without imports once bundled. It hands its report to whoever runs it.
import { elementaryValues } from "./elementaryValues.ts";
import { stateSearches } from "./stateSearches.ts";

/** What an engine reports. */
export interface EngineReport {
  /** False where `new Function` is forbidden, so that everything went through the interpreter. */
  readonly generates: boolean;
  readonly values: ReturnType<typeof elementaryValues>;
  readonly searches: ReturnType<typeof stateSearches>;
}

function mayGenerate(): boolean {
  try {
    return new Function("return true")() === true;
  } catch {
    return false;
  }
}

/** Shells of engines print, pages send, the others have a console. */
interface Host {
  readonly print?: (text: string) => void;
  readonly document?: object;
  readonly fetch?: (path: string, options: { method: string; body: string }) => Promise<unknown>;
  readonly console?: { log(text: string): void };
}

const host = globalThis as Host;

function hand(text: string): void {
  if (host.document && host.fetch) host.fetch("/report", { method: "POST", body: text });
  else if (host.print) host.print(text);
  else host.console?.log(text);
}

try {
  const report: EngineReport = {
    generates: mayGenerate(),
    values: elementaryValues(),
    searches: stateSearches(),
  };
  hand(JSON.stringify(report));
} catch (error) {
  hand(JSON.stringify({ error: `${error} ${error instanceof Error ? error.stack : ""}` }));
}
