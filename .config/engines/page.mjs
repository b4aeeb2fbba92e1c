// Runs the program in a browser: a page served from loopback, which sends its report back.
import { spawn } from "node:child_process";
import fs from "node:fs";
import http from "node:http";
import os from "node:os";
import path from "node:path";
import { stop } from "./processes.mjs";

/** A page that allows its own scripts only: `new Function` and `eval` are forbidden on it. */
export const STRICT_POLICY = "script-src 'self'";

const PAGE =
  '<!doctype html><meta charset="utf-8"><title>engine</title><script type="module" src="/program.mjs"></script>';

/** Serves the page and the program, and hands what is posted to `receive`. */
function serve(program, policy, receive) {
  const server = http.createServer((request, response) => {
    if (request.method === "POST") {
      let body = "";
      request.setEncoding("utf8");
      request.on("data", (part) => {
        body += part;
      });
      request.on("end", () => {
        response.end();
        receive(body);
      });
      return;
    }
    const isPage = request.url === "/";
    if (!isPage && request.url !== "/program.mjs") {
      response.writeHead(404).end();
      return;
    }
    response.writeHead(200, {
      "content-type": isPage ? "text/html" : "text/javascript",
      ...(policy && { "content-security-policy": policy }),
    });
    response.end(isPage ? PAGE : fs.readFileSync(program));
  });
  return new Promise((resolve) => server.listen(0, "127.0.0.1", () => resolve(server)));
}

const chromiumFlags = (profile) => [
  "--headless=new",
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--disable-dev-shm-usage",
  `--user-data-dir=${profile}`,
];

// Without these it looks for updates, studies and portals when it starts.
const firefoxPreferences = {
  "app.normandy.enabled": false,
  "app.update.enabled": false,
  "browser.shell.checkDefaultBrowser": false,
  "browser.startup.homepage_override.mstone": "ignore",
  "datareporting.policy.dataSubmissionEnabled": false,
  "extensions.systemAddon.update.enabled": false,
  "extensions.update.enabled": false,
  "network.captive-portal-service.enabled": false,
  "network.connectivity-service.enabled": false,
  "services.settings.server": "data:,",
  "toolkit.telemetry.reportingpolicy.firstRun": false,
};

function firefoxFlags(profile) {
  const lines = Object.entries(firefoxPreferences).map(
    ([name, value]) => `user_pref(${JSON.stringify(name)}, ${JSON.stringify(value)});\n`,
  );
  fs.writeFileSync(path.join(profile, "user.js"), lines.join(""));
  return ["--headless", "--no-remote", "--profile", profile];
}

const flagsOf = { chromium: chromiumFlags, firefox: firefoxFlags };

/** The report of a page in a browser of a kind, `chromium` or `firefox`. */
export async function reportOfPage(kind, command, program, { policy, seconds = 300 } = {}) {
  const profile = fs.mkdtempSync(path.join(os.tmpdir(), "thermostead-page-"));
  let browser;
  let server;
  let timer;
  try {
    return await new Promise((resolve, reject) => {
      serve(program, policy, resolve).then((listening) => {
        server = listening;
        const page = `http://127.0.0.1:${server.address().port}/`;
        browser = spawn(command, [...flagsOf[kind](profile), page], {
          stdio: "ignore",
          detached: process.platform !== "win32",
          env: { ...process.env, HOME: profile },
        });
        browser.on("error", reject);
        browser.on("exit", (status) =>
          reject(new Error(`${command} ended with ${status} before it reported`)),
        );
        timer = setTimeout(
          () => reject(new Error(`${command} sent no report in ${seconds} s`)),
          seconds * 1000,
        );
      }, reject);
    });
  } finally {
    clearTimeout(timer);
    if (browser?.pid !== undefined) {
      const gone = new Promise((resolve) => browser.once("close", resolve));
      stop(browser);
      if (browser.exitCode === null) await gone;
    }
    server?.closeAllConnections();
    server?.close();
    fs.rmSync(profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 100 });
  }
}
