import assert from "node:assert/strict";
import { test } from "node:test";
import { byLikeness, type Choice } from "../src/choices";

function choices(...labels: string[]): Choice[] {
  return labels.map((label) => ({ label, uri: `file:///job/${label}` }));
}

function ordered(own: string, ...others: string[]): string[] {
  const [self] = choices(own);
  assert.ok(self);
  return byLikeness(self, choices(...others)).map(({ label }) => label);
}

test("the same name in another folder first, then names that begin alike, then the rest", () => {
  assert.deepEqual(
    ordered("de/lamp.md", "en/boat.md", "notes.txt", "old/lamp_en.txt", "en/lamp.md", "lamp.de.md"),
    ["en/lamp.md", "lamp.de.md", "old/lamp_en.txt", "en/boat.md", "notes.txt"],
  );
});

test("neither the file itself nor anything twice", () => {
  assert.deepEqual(ordered("a.md", "a.md", "b.md", "b.md"), ["b.md"]);
});

test("upper and lower case do not part what belongs together", () => {
  assert.deepEqual(ordered("Guide.md", "a.md", "guide.DE.md", "fr/GUIDE.md"), [
    "fr/GUIDE.md",
    "guide.DE.md",
    "a.md",
  ]);
});
