/** How many times the server is started again within the time below. */
const MOST = 4;

/** Crashes longer ago than this many milliseconds are forgotten. */
const MEMORY = 3 * 60_000;

/** Decides whether a server that has crashed is started once more. */
export class Restarts {
  private readonly now: () => number;
  private crashes: number[] = [];

  /** @param now the time in milliseconds */
  constructor(now: () => number) {
    this.now = now;
  }

  /** The server has crashed: may it be started again? */
  again(): boolean {
    const time = this.now();
    this.crashes = this.crashes.filter((crash) => time - crash < MEMORY);
    this.crashes.push(time);
    return this.crashes.length <= MOST;
  }
}
