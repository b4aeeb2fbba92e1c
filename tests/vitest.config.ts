// How the tests run: from the repository's root, in threads. What is shipped is loaded by Node from dist, unaltered.
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  cacheDir: "node_modules/.cache/vite",
  test: {
    include: ["tests/**/*.test.ts"],
    pool: "threads",
    testTimeout: 20_000,
    hookTimeout: 60_000,
    server: { deps: { external: [/\/dist\//] } },
  },
});
