// Installs the editor that the extension is tested in, unless it is there already.
import { execFileSync } from "node:child_process";
import { existsSync, mkdirSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { COMPLETE, EDITOR, PLACE, VERSION } from "./place.mjs";

if (!existsSync(COMPLETE)) {
  rmSync(PLACE, { recursive: true, force: true });
  mkdirSync(PLACE, { recursive: true });
  writeFileSync(join(PLACE, "package.json"), JSON.stringify({ name: "editor", private: true }));
  // Its own install script fetches from elsewhere, so what it does is done here, step by step.
  npm(PLACE, `code-server@${VERSION}`);
  leaveOutPasswords();
  const vscode = join(EDITOR, "lib/vscode");
  npm(vscode, "--omit=dev");
  symlinkSync("node_modules", join(vscode, "node_modules.asar"));
  const search = join(vscode, "node_modules/@vscode/ripgrep/bin");
  mkdirSync(search, { recursive: true });
  symlinkSync("/usr/bin/rg", join(search, "rg"));
  writeFileSync(COMPLETE, "");
}

function npm(/** @type {string} */ folder, /** @type {string[]} */ ...what) {
  const quietly = ["--ignore-scripts", "--no-package-lock", "--no-audit", "--no-fund"];
  execFileSync("npm", ["install", ...quietly, ...what], { cwd: folder, stdio: "inherit" });
}

/** The check of passwords is native code that would have to be compiled; no test logs in. */
function leaveOutPasswords() {
  const folder = join(PLACE, "node_modules/argon2");
  rmSync(folder, { recursive: true });
  mkdirSync(folder);
  writeFileSync(join(folder, "package.json"), JSON.stringify({ name: "argon2", main: "none.js" }));
  writeFileSync(join(folder, "none.js"), "");
}
