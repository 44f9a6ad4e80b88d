import assert from "node:assert/strict";
import { execFileSync } from "node:child_process";
import { join } from "node:path";
import { test } from "node:test";
import { serverArguments } from "../src/launch";
import { folder, program } from "./fake-java";

test("the server is started quietly, by one file, and told whose it is", () => {
  assert.deepEqual(serverArguments("/a folder/tallystick.jar", 4711), [
    "-XX:+UseSerialGC",
    "-Xlog:disable",
    "-Xlog:all=warning:stderr",
    "-jar",
    "/a folder/tallystick.jar",
    "serve",
    "--stdio",
    "--clientProcessId",
    "4711",
  ]);
});

test("a path with spaces and quotes arrives as one argument", (t) => {
  const jar = '/it\'s a "folder"/$HOME/tallystick.jar';
  const command = program(join(folder(t), "java"), `printf '%s\\n' "$5"`);
  assert.equal(execFileSync(command, serverArguments(jar, 1), { encoding: "utf8" }), `${jar}\n`);
});
