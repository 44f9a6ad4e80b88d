import { chmodSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import type { TestContext } from "node:test";

/** A folder that is gone after the test. */
export function folder(test: TestContext): string {
  const path = mkdtempSync(join(tmpdir(), "tallystick-"));
  test.after(() => {
    rmSync(path, { recursive: true });
  });
  return path;
}

/** A program that answers like the `java` of that version, with what some machines print before. */
export function java(path: string, version: string): string {
  return program(
    path,
    `echo 'Picked up JAVA_TOOL_OPTIONS: -Dversion="3"' >&2\necho 'openjdk version "${version}" 2026-01-20' >&2`,
  );
}

/** A program that does what the lines of shell say. */
export function program(path: string, lines: string): string {
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, `#!/bin/sh\n${lines}\n`);
  chmodSync(path, 0o755);
  return path;
}
