import * as vscode from "vscode";
import { isText, registerCommands } from "./commands";
import { PROJECT_FILE } from "./formats";
import { Service } from "./service";

let service: Service | undefined;

/** Called by the editor once a folder or a file may concern us. */
export async function activate(context: vscode.ExtensionContext): Promise<void> {
  const log = vscode.window.createOutputChannel("Tallystick", { log: true });
  const own = new Service(context, log);
  service = own;
  context.subscriptions.push(
    log,
    ...registerCommands(own),
    vscode.workspace.onDidChangeConfiguration((change) => {
      if (change.affectsConfiguration("tallystick.java")) {
        void own.restart();
      }
    }),
  );
  if (vscode.workspace.textDocuments.some(isText) || (await isProject())) {
    void own.ready();
  } else {
    awaitText(own, context);
  }
}

/** Called by the editor before it ends. */
export async function deactivate(): Promise<void> {
  await service?.stop();
}

/**
 * The editor calls every file plain text that it does not know. No Java is started for a licence
 * or a file of some program.
 */
function awaitText(own: Service, context: vscode.ExtensionContext): void {
  const waiting = vscode.workspace.onDidOpenTextDocument((document) => {
    if (isText(document)) {
      waiting.dispose();
      void own.ready();
    }
  });
  context.subscriptions.push(waiting);
}

/** Whether a folder has the settings of a project. */
async function isProject(): Promise<boolean> {
  const folders = vscode.workspace.workspaceFolders ?? [];
  const files = folders.map(({ uri }) => vscode.Uri.joinPath(uri, PROJECT_FILE));
  return (await Promise.all(files.map(exists))).includes(true);
}

async function exists(file: vscode.Uri): Promise<boolean> {
  try {
    await vscode.workspace.fs.stat(file);
    return true;
  } catch {
    return false;
  }
}
