// Runs the unit tests, which see everything but what needs an editor.
import { build } from "esbuild";
import { spawnSync } from "node:child_process";
import { readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const out = join(root, "target/test");
const names = readdirSync(join(root, "test")).filter((name) => name.endsWith(".test.ts"));

rmSync(out, { recursive: true, force: true });
await build({
  absWorkingDir: root,
  entryPoints: names.map((name) => join("test", name)),
  outdir: out,
  outExtension: { ".js": ".mjs" },
  bundle: true,
  platform: "node",
  format: "esm",
  target: "node20",
  sourcemap: "inline",
  logLevel: "warning",
});

const bundles = names.map((name) => join(out, name.replace(/\.ts$/, ".mjs")));
const options = ["--enable-source-maps", "--test", "--test-reporter=spec"];
const { status } = spawnSync(process.execPath, [...options, ...bundles], {
  cwd: root,
  stdio: "inherit",
});
process.exitCode = status ?? 1;
