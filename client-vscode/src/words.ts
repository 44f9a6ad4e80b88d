import { OLDEST, type Attempt } from "./java";

/** What is written on the buttons of messages. */
export const BUTTONS = {
  tryAgain: "Try Again",
  settings: "Open Settings",
  log: "Show Log",
} as const;

/** No Java was found: what to do, and where it was looked for. */
export function noJava(attempts: readonly Attempt[]): string {
  const [first] = attempts;
  if (first?.origin === "tallystick.java") {
    return (
      `Tallystick needs Java ${OLDEST} or newer, and the setting tallystick.java does not lead` +
      ` to one: ${because(first)}. Set it to the full path of the program java or of the folder` +
      " that Java is installed in, or clear it."
    );
  }
  return (
    `Tallystick needs Java ${OLDEST} or newer and found none. Install one, or name yours in the` +
    ` setting tallystick.java. Looked at ${attempts.map(looked).join("; ")}.`
  );
}

function looked(attempt: Attempt): string {
  const nothing = attempt.origin === "PATH" && attempt.reason.kind === "absent";
  return nothing ? `PATH: no ${attempt.where} in it` : `${attempt.origin}: ${because(attempt)}`;
}

function because({ where, reason }: Attempt): string {
  switch (reason.kind) {
    case "relative":
      return `${where} is not a full path`;
    case "absent":
      return `there is no file ${where}`;
    case "old":
      return `${where} is Java ${reason.version}`;
    case "mute":
      return `${where} does not tell its version`;
    case "broken":
      return `${where} cannot be run (${reason.fault})`;
  }
}

export const NOT_STARTED =
  "Tallystick could not start its server, so nothing is checked. The log says more.";

/** For the log only. */
export const ENDED = "The server has ended unexpectedly.";

export const CRASHED =
  "Tallystick's server has ended unexpectedly several times in a row, so it is not started again" +
  " by itself and nothing is checked. Your files are untouched. The log says more.";

export const NO_TEXT = "Open a source or a translation first, and put the cursor into it.";

export const NO_MATCH = "Nothing is known to match this place.";

export const NO_FOLDER = "Open a folder first: a file alone has no folder to check.";

/** The server is older than the extension, or the command has been taken out. */
export function notKnown(command: string): string {
  return `The server of this version of Tallystick cannot do this (it does not know ${command}).`;
}
