import { mkdir } from "node:fs/promises";
import * as vscode from "vscode";
import {
  CloseAction,
  ErrorAction,
  LanguageClient,
  RevealOutputChannelOn,
  State,
  type Executable,
  type LanguageClientOptions,
} from "vscode-languageclient/node";
import { FILTERS } from "./formats";
import { findJava, type Places } from "./java";
import { serverArguments } from "./launch";
import { Restarts } from "./restarts";
import { BUTTONS, CRASHED, ENDED, noJava, NOT_STARTED } from "./words";

/** The library's client, which leaves it to us what a user is told of its own troubles. */
class Connection extends LanguageClient {
  override error(message: string, data?: unknown): void {
    super.error(message, data, false);
  }
}

/** The server, at most one: found, started, started again after a crash, and stopped. */
export class Service {
  private readonly context: vscode.ExtensionContext;
  private readonly log: vscode.LogOutputChannel;
  private restarts = new Restarts(Date.now);
  private running: Promise<LanguageClient | undefined> | undefined;

  constructor(context: vscode.ExtensionContext, log: vscode.LogOutputChannel) {
    this.context = context;
    this.log = log;
  }

  /** The server's client, started if need be; undefined if it cannot be, and the user knows why. */
  ready(): Promise<LanguageClient | undefined> {
    this.running ??= this.start();
    return this.running;
  }

  /** Stops the server, if it runs. */
  async stop(): Promise<void> {
    const running = this.running;
    const client = await running;
    if (this.running === running) {
      this.running = undefined;
    }
    if (client?.state === State.Running) {
      await client.stop();
    }
  }

  /** Stops the server and starts another, whatever has happened before. */
  async restart(): Promise<void> {
    this.restarts = new Restarts(Date.now);
    try {
      await this.stop();
    } catch (error) {
      this.log.warn(`The server did not stop in good order: ${String(error)}`);
    }
    await this.ready();
  }

  private async start(): Promise<LanguageClient | undefined> {
    const java = await findJava(places());
    if (!java.found) {
      this.giveUp(noJava(java.attempts), BUTTONS.settings);
      return undefined;
    }
    this.log.info(`Java ${java.version}: ${java.command}`);
    try {
      const server = await this.executable(java.command);
      const client = new Connection("tallystick-client", "Tallystick", server, this.options());
      await client.start();
      return client;
    } catch (error) {
      this.log.error(String(error));
      this.giveUp(NOT_STARTED, BUTTONS.log);
      return undefined;
    }
  }

  /** In a folder of its own: what a dying Java leaves behind must not lie among translations. */
  private async executable(command: string): Promise<Executable> {
    const cwd = this.context.logUri.fsPath;
    await mkdir(cwd, { recursive: true });
    const jar = this.context.asAbsolutePath("tallystick.jar");
    return { command, args: serverArguments(jar, process.pid), options: { cwd } };
  }

  private options(): LanguageClientOptions {
    return {
      documentSelector: [...FILTERS],
      outputChannel: this.log,
      diagnosticCollectionName: "tallystick",
      revealOutputChannelOn: RevealOutputChannelOn.Never,
      initializationFailedHandler: () => false,
      errorHandler: {
        error: () => ({ action: ErrorAction.Continue, handled: true }),
        closed: () => {
          void this.ended();
          return { action: CloseAction.DoNotRestart, handled: true, message: ENDED };
        },
      },
    };
  }

  /**
   * The server is gone without being asked to. A new client is made for the next one: that finds
   * Java anew, and tells of a start that fails as it does the first time.
   */
  private async ended(): Promise<void> {
    const gone = await this.running;
    if (gone === undefined) {
      return; // It ended before it was up, so its start has failed and has told.
    }
    this.running = undefined;
    if (this.restarts.again()) {
      await this.ready();
    } else {
      this.giveUp(CRASHED, BUTTONS.log);
    }
  }

  /** There is no server until the user acts. */
  private giveUp(message: string, button: string): void {
    this.running = undefined;
    this.log.error(message);
    void this.offer(message, button);
  }

  private async offer(message: string, button: string): Promise<void> {
    const chosen = await vscode.window.showErrorMessage(message, BUTTONS.tryAgain, button);
    if (chosen === BUTTONS.tryAgain) {
      await this.restart();
    } else if (chosen === BUTTONS.settings) {
      await vscode.commands.executeCommand("workbench.action.openSettings", "tallystick.java");
    } else if (chosen === BUTTONS.log) {
      this.log.show();
    }
  }
}

function places(): Places {
  return {
    setting: vscode.workspace.getConfiguration("tallystick").get("java", ""),
    javaHome: process.env.JAVA_HOME,
    path: process.env.PATH,
    windows: process.platform === "win32",
  };
}
