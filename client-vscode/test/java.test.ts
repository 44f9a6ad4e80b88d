import assert from "node:assert/strict";
import { chmodSync, mkdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { describe, test } from "node:test";
import { findJava, parseVersion, type Places, type Search } from "../src/java";
import { folder, java, program } from "./fake-java";

function search(places: Partial<Places>, patience?: number): Promise<Search> {
  const none = { setting: "", javaHome: undefined, path: undefined, windows: false };
  return findJava({ ...none, ...places }, patience);
}

function attempts(search: Search): readonly object[] {
  assert.ok(!search.found, JSON.stringify(search));
  return search.attempts;
}

describe("where Java is looked for", () => {
  test("the setting comes first, as a path of the program", async (t) => {
    const top = folder(t);
    const command = java(join(top, "mine/java"), "17.0.9");
    java(join(top, "home/bin/java"), "21");
    const found = await search({ setting: command, javaHome: join(top, "home") });
    assert.deepEqual(found, { found: true, command, version: 17 });
  });

  test("the setting may be the folder that Java is in", async (t) => {
    const top = folder(t);
    const command = java(join(top, "bin/java"), "25.0.1");
    const found = await search({ setting: ` ${top} ` });
    assert.deepEqual(found, { found: true, command, version: 25 });
  });

  test("a wrong setting is not passed over in silence", async (t) => {
    const top = folder(t);
    java(join(top, "home/bin/java"), "21");
    const where = join(top, "gone/java");
    const result = await search({ setting: where, javaHome: join(top, "home") });
    const reason = { kind: "absent" };
    assert.deepEqual(attempts(result), [{ origin: "tallystick.java", where, reason }]);
  });

  test("a relative setting is refused: it would mean a place in what is translated", async () => {
    const reason = { kind: "relative" };
    assert.deepEqual(attempts(await search({ setting: "jdk/bin/java" })), [
      { origin: "tallystick.java", where: "jdk/bin/java", reason },
    ]);
  });

  test("JAVA_HOME comes before PATH", async (t) => {
    const top = folder(t);
    const command = java(join(top, "home/bin/java"), "17");
    java(join(top, "path/java"), "21");
    const found = await search({ javaHome: join(top, "home"), path: join(top, "path") });
    assert.deepEqual(found, { found: true, command, version: 17 });
  });

  test("an old JAVA_HOME and an old entry of PATH are passed over for a newer one", async (t) => {
    const top = folder(t);
    java(join(top, "home/bin/java"), "11.0.2");
    java(join(top, "a/java"), "1.8.0_392");
    mkdirSync(join(top, "b/java"), { recursive: true });
    const command = java(join(top, "c/java"), "24-ea");
    const path = ["a", "b", "c"].map((name) => join(top, name)).join(":");
    const found = await search({ javaHome: join(top, "home"), path });
    assert.deepEqual(found, { found: true, command, version: 24 });
  });

  test("where nothing will do, all that was tried is told in its order", async (t) => {
    const top = folder(t);
    const home = java(join(top, "home/bin/java"), "11.0.2");
    const old = java(join(top, "a/java"), "1.8.0_392");
    const path = `${join(top, "a")}:${join(top, "a")}:${join(top, "empty")}`;
    assert.deepEqual(attempts(await search({ javaHome: join(top, "home"), path })), [
      { origin: "JAVA_HOME", where: home, reason: { kind: "old", version: 11 } },
      { origin: "PATH", where: old, reason: { kind: "old", version: 8 } },
    ]);
  });

  test("nothing set and nothing there", async () => {
    const reason = { kind: "absent" };
    const missing = [{ origin: "PATH", where: "java", reason }];
    assert.deepEqual(attempts(await search({})), missing);
    assert.deepEqual(attempts(await search({ javaHome: "", path: "" })), missing);
  });

  test("relative entries of PATH are passed over", async () => {
    const reason = { kind: "absent" };
    assert.deepEqual(attempts(await search({ path: ".:bin::" })), [
      { origin: "PATH", where: "java", reason },
    ]);
  });

  test("on Windows the program is java.exe and PATH is parted by semicolons", async () => {
    const result = await search({ javaHome: "C:\\jdk", path: "C:\\a;D:\\b", windows: true });
    const reason = { kind: "absent" };
    assert.deepEqual(attempts(result), [
      { origin: "JAVA_HOME", where: "C:\\jdk\\bin\\java.exe", reason },
      { origin: "PATH", where: "java.exe", reason },
    ]);
  });

  test("the Java that built this is found", async () => {
    const { JAVA_HOME: javaHome, PATH: path } = process.env;
    const found = await search({ javaHome, path, windows: process.platform === "win32" });
    assert.ok(found.found, JSON.stringify(found));
  });
});

describe("a program that is no Java", () => {
  async function reason(command: string, patience?: number): Promise<unknown> {
    const [attempt] = attempts(await search({ setting: command }, patience));
    return attempt && "reason" in attempt ? attempt.reason : undefined;
  }

  test("fails: its last words are told", async (t) => {
    const command = program(
      join(folder(t), "java"),
      "echo one >&2\necho No Java here. >&2\nexit 1",
    );
    assert.deepEqual(await reason(command), { kind: "broken", fault: "No Java here." });
  });

  test("says something else", async (t) => {
    const command = program(join(folder(t), "java"), "echo hello");
    assert.deepEqual(await reason(command), { kind: "mute" });
  });

  test("does not answer", async (t) => {
    const command = program(join(folder(t), "java"), "exec tail -f /dev/null");
    assert.deepEqual(await reason(command, 50), { kind: "broken", fault: "it did not answer" });
  });

  test("cannot be executed", async (t) => {
    const command = join(folder(t), "java");
    writeFileSync(command, "text");
    chmodSync(command, 0o644);
    assert.deepEqual(await reason(command), { kind: "broken", fault: "EACCES" });
  });
});

// The forms are those of JEP 223 and of java.lang.Runtime.Version, and the older 1.x form.
test("the main version is read from what java -version prints", () => {
  const versions: [string, number | undefined][] = [
    ['openjdk version "17.0.9" 2023-10-17\nOpenJDK Runtime Environment (build 17.0.9+9)', 17],
    ['java version "1.8.0_391"\r\nJava(TM) SE Runtime Environment', 8],
    ['openjdk version "21" 2023-09-19 LTS', 21],
    ['openjdk version "25-ea" 2025-09-16', 25],
    ['Picked up JAVA_TOOL_OPTIONS: -Xmx1g\nopenjdk version "11.0.2"', 11],
    ["The operation could not be completed.", undefined],
    ["", undefined],
  ];
  for (const [printed, version] of versions) {
    assert.equal(parseVersion(printed), version, printed);
  }
});
