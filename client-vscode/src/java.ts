import { execFile } from "node:child_process";
import { stat } from "node:fs/promises";
import { posix, win32 } from "node:path";

/** The oldest Java that the server runs on. */
export const OLDEST = 17;

/** How long a Java may take to tell its version, in milliseconds. */
const PATIENCE = 20_000;

/** Where to look for Java; an empty text and a missing value both mean that nothing is set. */
export interface Places {
  /** The setting `tallystick.java`: a path of the program, or of a folder that Java is in. */
  readonly setting: string;
  readonly javaHome: string | undefined;
  readonly path: string | undefined;
  readonly windows: boolean;
}

/** Why a place that was looked at gives no Java. */
export type Reason =
  | { readonly kind: "relative" }
  | { readonly kind: "absent" }
  | { readonly kind: "old"; readonly version: number }
  | { readonly kind: "mute" }
  | { readonly kind: "broken"; readonly fault: string };

/** A place that was looked at in vain; `where` is the program, or what was set. */
export interface Attempt {
  readonly origin: "tallystick.java" | "JAVA_HOME" | "PATH";
  readonly where: string;
  readonly reason: Reason;
}

/** The program `java` by its full path and its main version, or all that was tried. */
export type Search =
  | { readonly found: true; readonly command: string; readonly version: number }
  | { readonly found: false; readonly attempts: readonly Attempt[] };

type Place = Pick<Attempt, "origin" | "where"> & { readonly commands: readonly string[] };

/**
 * Finds a Java that is new enough: the setting, else `JAVA_HOME`, else `PATH`. A setting is a
 * decision: where it is wrong nothing else is tried.
 */
export async function findJava(places: Places, patience = PATIENCE): Promise<Search> {
  const attempts: Attempt[] = [];
  for (const { commands, ...place } of await candidates(places)) {
    if (commands.length === 0) {
      attempts.push({ ...place, reason: { kind: "absent" } });
    }
    for (const command of commands) {
      const version = absolute(command, places) ? await versionOf(command, patience) : RELATIVE;
      if (typeof version === "number" && version >= OLDEST) {
        return { found: true, command, version };
      }
      const reason = typeof version === "number" ? ({ kind: "old", version } as const) : version;
      attempts.push({ origin: place.origin, where: command, reason });
    }
  }
  return { found: false, attempts };
}

const RELATIVE: Reason = { kind: "relative" };

/**
 * The places in their order. Relative entries of `PATH` are passed over: they would mean the
 * folder of whatever is being translated.
 */
async function candidates(places: Places): Promise<Place[]> {
  const paths = places.windows ? win32 : posix;
  const program = places.windows ? "java.exe" : "java";
  const setting = places.setting.trim();
  if (setting !== "") {
    const inFolder = paths.join(setting, "bin", program);
    const isFolder = await is(setting, "folder");
    return [
      { origin: "tallystick.java", where: setting, commands: [isFolder ? inFolder : setting] },
    ];
  }
  const found: Place[] = [];
  if (places.javaHome) {
    const command = paths.join(places.javaHome, "bin", program);
    found.push({ origin: "JAVA_HOME", where: command, commands: [command] });
  }
  const entries = (places.path ?? "")
    .split(paths.delimiter)
    .filter((entry) => absolute(entry, places));
  const onPath = [...new Set(entries.map((entry) => paths.join(entry, program)))];
  const there = await Promise.all(onPath.map((command) => is(command, "file")));
  const commands = onPath.filter((_, index) => there[index]);
  return [...found, { origin: "PATH", where: program, commands }];
}

function absolute(path: string, places: Places): boolean {
  return (places.windows ? win32 : posix).isAbsolute(path);
}

async function is(path: string, kind: "file" | "folder"): Promise<boolean> {
  try {
    const entry = await stat(path);
    return kind === "file" ? entry.isFile() : entry.isDirectory();
  } catch {
    return false;
  }
}

/** Asks a Java for its main version: 8 for 1.8.0, 17 for 17.0.9. */
async function versionOf(command: string, patience: number): Promise<number | Reason> {
  if (!(await is(command, "file"))) {
    return { kind: "absent" };
  }
  return new Promise((resolve) => {
    const options = { timeout: patience, windowsHide: true };
    execFile(command, ["-version"], options, (error, out, err) => {
      const version = parseVersion(`${err}\n${out}`);
      if (error === null) {
        resolve(version ?? { kind: "mute" });
      } else {
        resolve({ kind: "broken", fault: fault(error, err) });
      }
    });
  });
}

/** The last line that a program printed says best why it failed, else the system's own word. */
function fault(
  error: { killed?: boolean; code?: unknown; message: string },
  printed: string,
): string {
  if (error.killed === true) {
    return "it did not answer";
  }
  const last = printed.trim().split(/\r?\n/).at(-1) ?? "";
  return last !== "" ? last : typeof error.code === "string" ? error.code : error.message;
}

/** The main version in what `java -version` prints, or undefined if there is none in it. */
export function parseVersion(printed: string): number | undefined {
  const match = /\bversion "(?:1\.)?(\d+)/.exec(printed);
  return match?.[1] === undefined ? undefined : Number(match[1]);
}
