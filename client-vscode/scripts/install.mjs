// Fetches the packages of the lock file, unless they are here already.
import { spawnSync } from "node:child_process";
import { statSync } from "node:fs";

const OLDEST_NODE = 20;

const major = Number(process.versions.node.split(".", 1)[0]);
if (major < OLDEST_NODE) {
  console.error(
    `client-vscode is built with Node.js ${OLDEST_NODE} or newer, and this is ${process.versions.node}.` +
      " Install a newer one, or build the server alone: mvn verify -pl server -am",
  );
  process.exit(1);
}

/** When a file was last written, in milliseconds; 0 if there is none. */
function written(/** @type {string} */ file) {
  const url = new URL(`../${file}`, import.meta.url);
  return statSync(url, { throwIfNoEntry: false })?.mtimeMs ?? 0;
}

// npm writes this file last.
const fetched = written("node_modules/.package-lock.json");
if (fetched < Math.max(written("package.json"), written("package-lock.json"))) {
  const windows = process.platform === "win32"; // where npm is a script
  const { status } = spawnSync("npm", ["ci"], { stdio: "inherit", shell: windows });
  process.exitCode = status ?? 1;
}
