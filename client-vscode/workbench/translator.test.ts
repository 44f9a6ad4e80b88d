import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { test } from "node:test";
import type { Locator } from "playwright-core";
import { Workbench } from "./workbench";

/** How long all may take, in milliseconds; usually it is half a minute. */
const LIMIT = 300_000;

const SOURCE = "en/lamp.md";
const TARGET = "de/lamp.md";

let workbench: Workbench;

/** What the translator does, in this order: each step goes on from where the last one ended. */
const steps: [string, () => Promise<void>][] = [];

test("a translator works in VS Code", { timeout: LIMIT }, async () => {
  workbench = await Workbench.open(TARGET);
  let name = "";
  try {
    for (const [next, run] of steps) {
      name = next;
      await run();
    }
  } catch (cause) {
    await workbench.picture("failed");
    throw new Error(name, { cause });
  } finally {
    await workbench.close();
  }
});

function step(name: string, run: () => Promise<void>): void {
  steps.push([name, run]);
}

/** The findings under Problems, without the places that they refer to. */
function findings(code = ""): Locator {
  const icon = workbench.page.locator(".marker-icon");
  const rows = workbench.page.locator(".markers-panel .monaco-list-row", { has: icon });
  return rows.filter({ hasText: code });
}

/** The codes of the findings that are planted in the translation. */
function planted(): string[] {
  return readFileSync("../demo/planted.jsonl", "utf8")
    .split("\n")
    .filter((line) => line.includes(`"${TARGET}"`))
    .map((line) => /"code":"(\w+)"/.exec(line)?.[1] ?? line);
}

function isOmission(code: string): boolean {
  return code === "omission";
}

/** Waits for so many findings, and sees that they are these. */
async function awaitCodes(expected: string[]): Promise<void> {
  await findings()
    .nth(expected.length - 1)
    .waitFor();
  const codes = await findings().locator(".marker-code").allInnerTexts();
  assert.deepEqual(codes.sort(), expected.sort());
}

/** Waits until a file is the active one, in the only group or in one of two. */
async function awaitFile(file: string): Promise<void> {
  const group = workbench.page.locator(".editor-group-container.active");
  const [folder = ""] = file.split("/");
  await group.locator(".breadcrumbs-control").getByText(folder, { exact: true }).waitFor();
}

step("what is planted in the job is listed under Problems", async () => {
  await workbench.page.locator(".editor-instance .monaco-editor").first().waitFor();
  await workbench.page.keyboard.press("Control+Shift+M");
  // An omission is told on both sides.
  await awaitCodes([...planted(), ...planted().filter(isOmission)]);
  await workbench.picture("problems");
});

step("a finding is underlined where it is", async () => {
  await findings("Missing here").first().dblclick();
  await workbench.page.locator(".editor-instance .squiggly-warning").first().waitFor();
  await workbench.picture("underlined");
});

step("F12 jumps to the matching sentence", async () => {
  await workbench.putCursor(TARGET, "Salz ist der stille Feind");
  await workbench.page.keyboard.press("F12");
  await awaitFile(SOURCE);
  await workbench.awaitCursor(SOURCE, "Salt is the quiet enemy");
  await workbench.picture("jump");
});

step("the command jumps and keeps both sides in sight", async () => {
  const groups = workbench.page.locator(".editor-group-container");
  await workbench.call("Tallystick: Go to the Matching Sentence");
  await awaitFile(TARGET);
  await workbench.awaitCursor(TARGET, "Salz ist der stille Feind");
  assert.equal(await groups.count(), 2);

  await workbench.call("Tallystick: Go to the Matching Sentence");
  await awaitFile(SOURCE);
  await workbench.awaitCursor(SOURCE, "Salt is the quiet enemy");
  assert.equal(await groups.count(), 2);
  await workbench.picture("both");
  await workbench.call("Tallystick: Go to the Matching Sentence");
  await awaitFile(TARGET);
});

step("translating what is missing takes the marks away on both sides", async () => {
  await workbench.putCursor(TARGET, " Tragen Sie die dunkle Schutzbrille");
  await workbench.page.keyboard.insertText(
    " Die Linse bündelt das Licht zu einem Strahl, der Sie selbst durch geschlossene Lider für immer blenden kann.",
  );
  await findings("omission").first().waitFor({ state: "detached" });
  await workbench.picture("translated");
});

step("a server that dies is started again, and told what is not saved yet", async () => {
  const [first = 0, ...others] = workbench.servers();
  assert.deepEqual(others, []);
  process.kill(first, "SIGKILL");
  await findings().first().waitFor({ state: "detached" });
  await awaitCodes(planted().filter((code) => !isOmission(code)));
  const [second, ...more] = workbench.servers();
  assert.notEqual(second, first);
  assert.deepEqual(more, []);
});

step("a wrong setting for Java is told, and its repair is noticed", async () => {
  const message = workbench.page.locator(".notification-toast");
  workbench.setJava("/nowhere/java");
  await message.filter({ hasText: "there is no file /nowhere/java" }).waitFor();
  await findings().first().waitFor({ state: "detached" });
  await workbench.picture("no-java");
  workbench.setJava("");
  await awaitCodes(planted().filter((code) => !isOmission(code)));
});
