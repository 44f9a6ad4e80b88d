import { execFileSync, spawn, type ChildProcess } from "node:child_process";
import { once } from "node:events";
import {
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { createInterface } from "node:readline";
import { chromium, type Browser, type Page } from "playwright-core";
import { COMPLETE, EDITOR } from "./place.mjs";

const VSIX = resolve("target/tallystick.vsix");

/** Where a picture of each step is left. */
const PICTURES = resolve("target/pictures");

/** How long anything may take to appear, in milliseconds: the machine may be busy. */
const PATIENCE = 60_000;

/** Against what would disturb the tests, or call home. */
const SETTINGS = {
  "chat.disableAIFeatures": true,
  "editor.hover.delay": 100,
  "extensions.autoCheckUpdates": false,
  "extensions.autoUpdate": false,
  "files.autoSave": "off",
  "git.enabled": false,
  "security.workspace.trust.enabled": false,
  "telemetry.telemetryLevel": "off",
  "update.mode": "none",
  "workbench.enableExperiments": false,
  "workbench.reduceMotion": "on",
  "workbench.startupEditor": "none",
};

const SERVING = [
  ...["--auth", "none", "--bind-addr", "127.0.0.1:0"],
  "--disable-getting-started-override",
  "--disable-proxy",
  "--disable-telemetry",
  "--disable-update-check",
  "--disable-workspace-trust",
];

const BROWSER = "/usr/bin/chromium";

const BROWSING = [
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-gpu",
  "--disable-quic",
  "--disable-sync",
  "--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1",
  "--no-first-run",
];

/** A real VS Code with the extension in it, in a real browser, on a copy of the demo job. */
export class Workbench {
  private pictures = 0;

  private constructor(
    private readonly top: string,
    private readonly editor: ChildProcess,
    private readonly browser: Browser,
    readonly page: Page,
  ) {}

  /** Installs the extension, starts all, and opens a file of the job. */
  static async open(file: string): Promise<Workbench> {
    for (const needed of [COMPLETE, BROWSER, VSIX]) {
      if (!existsSync(needed)) {
        throw new Error(`${needed} is missing. Call .ci/run, which installs and builds all.`);
      }
    }
    rmSync(PICTURES, { recursive: true, force: true });
    const top = mkdtempSync(join(tmpdir(), "tallystick-"));
    cpSync("../demo", job(top), { recursive: true });
    writeFileSync(join(top, "config.yaml"), "");
    settings(top, "User", SETTINGS);
    settings(top, "Machine", {});
    const environment = privateEnvironment(top);
    const command = [
      join(EDITOR, "out/node/entry.js"),
      ...["--config", join(top, "config.yaml")],
      ...["--user-data-dir", join(top, "data")],
      ...["--extensions-dir", join(top, "extensions")],
    ];
    execFileSync(process.execPath, [...command, "--install-extension", VSIX], {
      env: environment,
      stdio: "pipe",
    });
    // In a group of its own, which can be ended as a whole.
    const editor = spawn(process.execPath, [...command, ...SERVING], {
      env: environment,
      detached: true,
      stdio: ["ignore", "pipe", "ignore"],
    });
    try {
      const browser = await chromium.launch({
        executablePath: BROWSER,
        args: BROWSING,
        chromiumSandbox: process.getuid?.() !== 0,
      });
      const page = await browser.newPage({ viewport: { width: 1400, height: 900 } });
      page.setDefaultTimeout(PATIENCE);
      await page.goto(urlOf(await addressOf(editor), job(top), file));
      return new Workbench(top, editor, browser, page);
    } catch (error) {
      await end(editor, top);
      throw error;
    }
  }

  /** Sets which Java is to be started; empty if the extension is to find one. */
  setJava(path: string): void {
    settings(this.top, "Machine", { "tallystick.java": path });
  }

  /** Calls a command of the palette by its full title. */
  async call(title: string): Promise<void> {
    await this.page.keyboard.press("F1");
    await this.page.locator(".quick-input-widget input").first().fill(`>${title}`);
    await this.page
      .locator(".quick-input-list .monaco-list-row", { hasText: title })
      .first()
      .click();
  }

  /** Puts the cursor into the open file before the first place that has these words. */
  async putCursor(file: string, words: string): Promise<void> {
    const { line, column } = this.place(file, words);
    await this.page.keyboard.press("Control+G");
    await this.page.locator(".quick-input-widget input").first().fill(`:${line}:${column}`);
    await this.page.keyboard.press("Enter");
    await this.awaitCursor(file, words);
  }

  /** Waits until the cursor is before the first place in a file that has these words. */
  async awaitCursor(file: string, words: string): Promise<void> {
    const { line, column } = this.place(file, words);
    const shown = this.page.locator("#status\\.editor\\.selection");
    await shown.filter({ hasText: `Ln ${line}, Col ${column}` }).waitFor();
  }

  /** Counted from 1, in the file as it is on the disk. */
  private place(file: string, words: string): { line: number; column: number } {
    const text = readFileSync(join(job(this.top), file), "utf8");
    const before = text.slice(0, text.indexOf(words)).split("\n");
    return { line: before.length, column: (before.at(-1) ?? "").length + 1 };
  }

  /** The numbers of the processes that run the server which this workbench has started. */
  servers(): number[] {
    return readdirSync("/proc")
      .filter((name) => /^\d+$/.test(name))
      .filter((name) => {
        const words = commandOf(name);
        return words.includes("serve") && words.some((word) => word.startsWith(`${this.top}/ext`));
      })
      .map(Number);
  }

  /** Leaves a picture for whoever wants to look. */
  async picture(name: string): Promise<void> {
    this.pictures += 1;
    const path = join(PICTURES, `${this.pictures}-${name}.png`);
    await this.page.screenshot({ path, animations: "disabled" });
  }

  async close(): Promise<void> {
    await this.browser.close();
    await end(this.editor, this.top);
  }
}

/** Ends the editor with all that it has started, and takes its folder away. */
async function end(editor: ChildProcess, top: string): Promise<void> {
  if (editor.pid !== undefined && editor.exitCode === null) {
    const ended = once(editor, "exit");
    process.kill(-editor.pid, "SIGKILL");
    await ended;
  }
  rmSync(top, { recursive: true, force: true, maxRetries: 10, retryDelay: 100 });
}

/** The address at which a browser sees a file of a folder opened. */
function urlOf(address: string, folder: string, file: string): string {
  const remote = `vscode-remote://${new URL(address).host}${folder}/${file}`;
  const query = new URLSearchParams({ folder, payload: JSON.stringify([["openFile", remote]]) });
  return `${address}/?${query.toString()}`;
}

function job(top: string): string {
  return join(top, "demo");
}

function settings(top: string, kind: "User" | "Machine", all: object): void {
  mkdirSync(join(top, "data", kind), { recursive: true });
  writeFileSync(join(top, "data", kind, "settings.json"), JSON.stringify(all));
}

function privateEnvironment(top: string): NodeJS.ProcessEnv {
  const environment: NodeJS.ProcessEnv = { ...process.env, EXTENSIONS_GALLERY: "{}", HOME: top };
  for (const name of ["CACHE_HOME", "CONFIG_HOME", "DATA_HOME", "RUNTIME_DIR"]) {
    const folder = join(top, name.toLowerCase());
    mkdirSync(folder, { mode: 0o700 });
    environment[`XDG_${name}`] = folder;
  }
  delete environment.VSCODE_IPC_HOOK_CLI;
  return environment;
}

/** Reads where the editor listens from what it prints. */
async function addressOf(editor: ChildProcess): Promise<string> {
  if (editor.stdout === null) {
    throw new Error("the editor has no standard output");
  }
  const printed: string[] = [];
  for await (const line of createInterface({ input: editor.stdout })) {
    printed.push(line);
    const address = /listening on (http:\S+?)\/?$/.exec(line)?.[1];
    if (address !== undefined) {
      editor.stdout.resume();
      return address;
    }
  }
  throw new Error(`the editor did not start: ${printed.join("\n")}`);
}

/** The words of a process's command line; none if it is gone. */
function commandOf(id: string): string[] {
  try {
    return readFileSync(join("/proc", id, "cmdline"), "utf8").split("\0");
  } catch {
    return [];
  }
}
