// Runs the tests of a folder: test, which needs no editor, or workbench, which drives one.
import { build } from "esbuild";
import { spawnSync } from "node:child_process";
import { readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const [folder = "test"] = process.argv.slice(2);
const root = fileURLToPath(new URL("..", import.meta.url));
const out = join(root, "target", folder);
const names = readdirSync(join(root, folder)).filter((name) => name.endsWith(".test.ts"));

rmSync(out, { recursive: true, force: true });
await build({
  absWorkingDir: root,
  entryPoints: names.map((name) => join(folder, name)),
  outdir: out,
  outExtension: { ".js": ".mjs" },
  bundle: true,
  packages: "external",
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
