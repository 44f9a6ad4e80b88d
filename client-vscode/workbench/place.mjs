// Where the editor is that the extension is tested in: outside of the repository.
import { homedir } from "node:os";
import { join } from "node:path";

/** A VS Code that serves a browser; this one is VS Code 1.100.3. */
export const VERSION = "4.100.3";

const cache = process.env.XDG_CACHE_HOME ?? join(homedir(), ".cache");

export const PLACE = join(cache, "tallystick", `code-server-${VERSION}`);

/** Stands there once all is installed. */
export const COMPLETE = join(PLACE, "complete");

export const EDITOR = join(PLACE, "node_modules/code-server");
