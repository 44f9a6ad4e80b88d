// Makes target/tallystick.vsix: the bundled client, the server and the schema of its settings.
import { createVSIX } from "@vscode/vsce";
import { build } from "esbuild";
import {
  copyFileSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const out = join(root, "target/extension");

/** What is copied, what it is called in the extension, and how to get it where it is missing. */
const COPIES = [
  [
    "../server/target/tallystick.jar",
    "tallystick.jar",
    "build it with: mvn package -pl server -am",
  ],
  [
    "../server/src/main/resources/dev/tallystick/project/tallystick.schema.json",
    "tallystick.schema.json",
    "it belongs to the sources of the server",
  ],
  ["../LICENSE", "LICENSE", "it belongs to the repository"],
  ["../CHANGELOG.md", "CHANGELOG.md", "it belongs to the repository"],
  ["README.md", "README.md", "it belongs to the repository"],
];

rmSync(out, { recursive: true, force: true });
mkdirSync(out, { recursive: true });
for (const [from = "", to = "", remedy] of COPIES) {
  const file = join(root, from);
  if (!existsSync(file)) {
    console.error(`${file} is missing; ${remedy}`);
    process.exit(1);
  }
  copyFileSync(file, join(out, to));
}

const { metafile } = await build({
  absWorkingDir: root,
  entryPoints: ["src/extension.ts"],
  outfile: join(out, "extension.js"),
  bundle: true,
  minify: true,
  platform: "node",
  format: "cjs",
  target: "node20",
  external: ["vscode"],
  metafile: true,
  logLevel: "warning",
});
writeFileSync(join(out, "THIRD-PARTY.txt"), licences(Object.keys(metafile.inputs)));
writeFileSync(join(out, "package.json"), JSON.stringify(manifest(), null, 2));

await createVSIX({
  cwd: out,
  packagePath: join(root, "target/tallystick.vsix"),
  dependencies: false,
  allowMissingRepository: true,
});

/** The manifest without what only serves building. */
function manifest() {
  const all = json(join(root, "package.json"));
  delete all.scripts;
  delete all.devDependencies;
  return { ...all, files: ["**"] };
}

/** The licences of the packages that are bundled, which ask to be passed on. */
function licences(/** @type {string[]} */ inputs) {
  const names = inputs.map(
    (input) => /node_modules\/((?:@[^/]+\/)?[^/]+)\//.exec(input)?.[1] ?? "",
  );
  const packages = [...new Set(names)].filter((name) => name !== "").sort();
  return packages.map(licence).join("\n");
}

function licence(/** @type {string} */ name) {
  const folder = join(root, "node_modules", name);
  const file = readdirSync(folder).find((entry) => /^licen[cs]e/i.test(entry));
  if (file === undefined) {
    throw new Error(`${name} is bundled and has no licence file in ${folder}`);
  }
  const version = String(json(join(folder, "package.json")).version);
  return `${name} ${version}\n\n${readFileSync(join(folder, file), "utf8").trim()}\n`;
}

/** @returns {Record<string, unknown>} */
function json(/** @type {string} */ file) {
  return /** @type {Record<string, unknown>} */ (JSON.parse(readFileSync(file, "utf8")));
}
