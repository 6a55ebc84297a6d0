// Builds dist/: the library and the command, bundled so that a start loads few files, and the type declarations.
import { execFileSync } from "node:child_process";
import { chmodSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

const root = dirname(dirname(fileURLToPath(import.meta.url)));
process.chdir(root);
rmSync("dist", { recursive: true, force: true });
await build({
  entryPoints: { index: "src/index.ts", "cli/main": "src/cli/main.ts" },
  outdir: "dist",
  bundle: true,
  splitting: true,
  // Chunks lie as deep as cli/main.js, so that ../../data names the data folder from every file.
  chunkNames: "chunks/[name]-[hash]",
  format: "esm",
  platform: "node",
  target: "node20",
  legalComments: "linked",
  banner: {
    js: 'import { createRequire as __createRequire } from "node:module"; const require = __createRequire(import.meta.url);',
  },
});
chmodSync("dist/cli/main.js", 0o755);
const tsc = join(dirname(createRequire(import.meta.url).resolve("typescript/package.json")), "bin", "tsc");
execFileSync(process.execPath, [tsc, "-p", "scripts/tsconfig.build.json"], { stdio: "inherit" });
