import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { test } from "node:test";
import { EXTENSIONS, FILTERS, TEXTS } from "../src/formats";

/** A file of the repository; the tests run in the folder of the client. */
function read(path: string): string {
  return readFileSync(path, "utf8");
}

interface Manifest {
  version: string;
  activationEvents: string[];
  contributes: {
    commands: { command: string; category: string; title: string }[];
    configuration: { properties: Record<string, { scope: string }> };
  };
}

const manifest = JSON.parse(read("package.json")) as Manifest;

test("the extensions are those that the README of the project lists", () => {
  const table = read("../README.md").split("| format | files |")[1]?.split("\n\n", 1)[0] ?? "";
  const listed = [...table.matchAll(/`\.(\w+)`/g)].map(([, extension]) => extension);
  assert.deepEqual(listed.sort(), [...EXTENSIONS].sort());
});

test("a file's extension counts in any case", () => {
  assert.match(TEXTS, /^\*\*\/\*\.\{.*\[mM\]\[dD\].*\}$/);
});

test("the server is told of texts, of new texts and of the settings of the project", () => {
  assert.deepEqual(FILTERS, [
    { scheme: "file", pattern: TEXTS },
    { scheme: "untitled", language: "asciidoc" },
    { scheme: "untitled", language: "dita" },
    { scheme: "untitled", language: "docbook" },
    { scheme: "untitled", language: "html" },
    { scheme: "untitled", language: "latex" },
    { scheme: "untitled", language: "markdown" },
    { scheme: "untitled", language: "mdx" },
    { scheme: "untitled", language: "plaintex" },
    { scheme: "untitled", language: "plaintext" },
    { scheme: "untitled", language: "restructuredtext" },
    { scheme: "untitled", language: "rst" },
    { scheme: "untitled", language: "srt" },
    { scheme: "untitled", language: "subrip" },
    { scheme: "untitled", language: "tex" },
    { scheme: "untitled", language: "vtt" },
    { scheme: "untitled", language: "webvtt" },
    { scheme: "untitled", language: "xml" },
    { scheme: "file", pattern: "**/tallystick.json" },
  ]);
});

test("the extension has the version of the project", () => {
  const version = /<version>([\d.]+)(-SNAPSHOT)?<\/version>/.exec(read("pom.xml"))?.[1];
  assert.equal(manifest.version, version);
});

test("which Java is started is not for a folder to say", () => {
  assert.equal(manifest.contributes.configuration.properties["tallystick.java"]?.scope, "machine");
});

test("each command is registered under its name and told in the extension's README", () => {
  const code = read("src/commands.ts");
  const readme = read("README.md");
  for (const { command, category, title } of manifest.contributes.commands) {
    const name = command.replace("tallystick.", "");
    assert.match(code, new RegExp(`[cC]ommand\\("(tallystick\\.)?${name}"`), command);
    assert.ok(readme.includes(`| ${category}: ${title} |`), title);
  }
});

test("no command has the name of one of the server's, which the library registers too", () => {
  const own = manifest.contributes.commands.map(({ command }) => command);
  const servers = ["pair", "finished", "draft", "checkFolder"].map((name) => `tallystick.${name}`);
  assert.deepEqual(
    servers.filter((name) => own.includes(name)),
    [],
  );
});
