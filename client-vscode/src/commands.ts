import * as vscode from "vscode";
import {
  DefinitionRequest,
  ExecuteCommandRequest,
  type LanguageClient,
} from "vscode-languageclient/node";
import { byLikeness, type Choice } from "./choices";
import { TEXT_FILTERS, TEXTS } from "./formats";
import type { Service } from "./service";
import { NO_FOLDER, NO_MATCH, NO_TEXT, notKnown } from "./words";

/** As many files of the workspace are offered as partners, and no more. */
const MOST_FILES = 5000;

/** For how many milliseconds the status bar says that something is done. */
const NOTICE = 5000;

const ELSEWHERE = "$(folder-opened) Choose a file...";

/** The commands of the palette. Their names differ from the server's, which are commands as well. */
export function registerCommands(service: Service): vscode.Disposable[] {
  const command = (name: string, run: (client: LanguageClient) => Promise<void>) =>
    vscode.commands.registerCommand(`tallystick.${name}`, async () => {
      const client = await service.ready();
      if (client !== undefined) {
        await run(client);
      }
    });
  return [
    command("goToMatch", goToMatch),
    command("pairWith", pairWith),
    command("markFinished", (client) => mark(client, "finished", "Marked as finished.")),
    command("markDraft", (client) => mark(client, "draft", "Marked as a draft.")),
    command("checkWholeFolder", checkFolder),
    vscode.commands.registerCommand("tallystick.restart", () => service.restart()),
  ];
}

async function goToMatch(client: LanguageClient): Promise<void> {
  const editor = textEditor();
  if (editor === undefined) {
    return;
  }
  const { document, selection } = editor;
  const at = client.code2ProtocolConverter.asTextDocumentPositionParams(document, selection.active);
  const answer = await client.sendRequest(DefinitionRequest.type, at);
  const result = await client.protocol2CodeConverter.asDefinitionResult(answer);
  const [place] = Array.isArray(result) ? result : [result];
  if (place === undefined) {
    vscode.window.setStatusBarMessage(NO_MATCH, NOTICE);
    return;
  }
  const [uri, range] =
    "targetUri" in place
      ? [place.targetUri, place.targetSelectionRange ?? place.targetRange]
      : [place.uri, place.range];
  const options = {
    selection: new vscode.Range(range.start, range.start),
    viewColumn: columnOf(uri),
  };
  const opened = await vscode.window.showTextDocument(uri, options);
  opened.revealRange(range, vscode.TextEditorRevealType.InCenterIfOutsideViewport);
}

/** Where a file is seen already, else beside this one: both sides stay in sight. */
function columnOf(uri: vscode.Uri): vscode.ViewColumn {
  const seen = vscode.window.visibleTextEditors.find(
    ({ document }) => document.uri.toString() === uri.toString(),
  );
  return seen?.viewColumn ?? vscode.ViewColumn.Beside;
}

async function pairWith(client: LanguageClient): Promise<void> {
  const own = textEditor()?.document.uri;
  if (own === undefined) {
    return;
  }
  const other = await partner(own);
  if (other === undefined) {
    return;
  }
  const [here, there] = [shown(own), shown(other)];
  const roles = [
    { label: `${here} is a translation of ${there}`, source: other, target: own },
    { label: `${there} is a translation of ${here}`, source: own, target: other },
  ];
  const role = await vscode.window.showQuickPick(roles, { placeHolder: "Which is which?" });
  if (role !== undefined) {
    const { code2ProtocolConverter: to } = client;
    await execute(client, "pair", { source: to.asUri(role.source), target: to.asUri(role.target) });
  }
}

async function partner(own: vscode.Uri): Promise<vscode.Uri | undefined> {
  const placeHolder = `What belongs to ${shown(own)}?`;
  const choices = choicesFor(own).then((likely) => [...likely, { label: ELSEWHERE, uri: "" }]);
  const chosen = await vscode.window.showQuickPick(choices, { placeHolder });
  if (chosen?.uri === "") {
    const files = await vscode.window.showOpenDialog({ title: placeHolder });
    return files?.[0];
  }
  return chosen && vscode.Uri.parse(chosen.uri, true);
}

async function choicesFor(own: vscode.Uri): Promise<Choice[]> {
  const open = vscode.workspace.textDocuments.filter(isText).map(({ uri }) => uri);
  const files = await vscode.workspace.findFiles(TEXTS, "**/node_modules/**", MOST_FILES);
  return byLikeness(choice(own), [...open, ...files].map(choice));
}

function choice(uri: vscode.Uri): Choice {
  return { label: shown(uri), uri: uri.toString() };
}

/** The path within its folder, with slashes on every system. */
function shown(uri: vscode.Uri): string {
  return vscode.workspace.asRelativePath(uri);
}

async function mark(client: LanguageClient, command: string, done: string): Promise<void> {
  const document = textEditor()?.document;
  if (document !== undefined) {
    const uri = client.code2ProtocolConverter.asUri(document.uri);
    if (await execute(client, command, uri)) {
      vscode.window.setStatusBarMessage(done, NOTICE);
    }
  }
}

async function checkFolder(client: LanguageClient): Promise<void> {
  const folder = await chosenFolder();
  if (folder === undefined) {
    return;
  }
  const options = { location: vscode.ProgressLocation.Window, title: `Checking ${folder.name}` };
  const uri = client.code2ProtocolConverter.asUri(folder.uri);
  const done = await vscode.window.withProgress(options, () => execute(client, "checkFolder", uri));
  if (done) {
    await vscode.commands.executeCommand("workbench.actions.view.problems");
  }
}

/** The folder of the file in sight, or the only one, or the one that the user picks. */
async function chosenFolder(): Promise<vscode.WorkspaceFolder | undefined> {
  const folders = vscode.workspace.workspaceFolders ?? [];
  if (folders.length === 0) {
    void vscode.window.showInformationMessage(NO_FOLDER);
    return undefined;
  }
  const uri = vscode.window.activeTextEditor?.document.uri;
  const own = uri && vscode.workspace.getWorkspaceFolder(uri);
  return own ?? (folders.length === 1 ? folders[0] : vscode.window.showWorkspaceFolderPick());
}

/** The editor in sight, if it has a text of ours; else the user is told. */
function textEditor(): vscode.TextEditor | undefined {
  const editor = vscode.window.activeTextEditor;
  if (editor !== undefined && isText(editor.document)) {
    return editor;
  }
  void vscode.window.showInformationMessage(NO_TEXT);
  return undefined;
}

/** Whether a document can be a source or a translation. */
export function isText(document: vscode.TextDocument): boolean {
  return vscode.languages.match(TEXT_FILTERS, document) > 0;
}

/** Has the server do something. If it cannot, the user is told why. */
async function execute(client: LanguageClient, name: string, argument: unknown): Promise<boolean> {
  const command = `tallystick.${name}`;
  const known = client.initializeResult?.capabilities.executeCommandProvider?.commands ?? [];
  if (!known.includes(command)) {
    void vscode.window.showWarningMessage(notKnown(command));
    return false;
  }
  try {
    await client.sendRequest(ExecuteCommandRequest.type, { command, arguments: [argument] });
    return true;
  } catch (error) {
    void vscode.window.showErrorMessage(error instanceof Error ? error.message : String(error));
    return false;
  }
}
