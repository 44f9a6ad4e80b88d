package dev.tallystick.lsp;

import com.google.gson.JsonObject;
import dev.tallystick.engine.Event;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Renaming;
import dev.tallystick.engine.Settings;
import dev.tallystick.project.ProjectFile;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Alarm;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.ConfigurationItem;
import org.eclipse.lsp4j.ConfigurationParams;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.DidChangeWatchedFilesParams;
import org.eclipse.lsp4j.DidChangeWatchedFilesRegistrationOptions;
import org.eclipse.lsp4j.DidChangeWorkspaceFoldersParams;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.FileEvent;
import org.eclipse.lsp4j.FileRename;
import org.eclipse.lsp4j.FileSystemWatcher;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.Registration;
import org.eclipse.lsp4j.RegistrationParams;
import org.eclipse.lsp4j.RenameFilesParams;
import org.eclipse.lsp4j.WatchKind;
import org.eclipse.lsp4j.WorkspaceDiagnosticParams;
import org.eclipse.lsp4j.WorkspaceDiagnosticReport;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.services.WorkspaceService;

/** What a client tells about folders, files and settings. */
final class Surroundings implements WorkspaceService {
  private static final String SECTION = "tallystick";

  private final Commands commands;
  private final Requests requests;
  private final Board board;
  private Loop loop;
  private Client client;
  private Views views;
  private Remote remote;
  private Alarm alarm;
  private List<String> told = List.of();
  private boolean taken;

  Surroundings(Requests requests, Board board, Commands commands) {
    this.requests = requests;
    this.board = board;
    this.commands = commands;
  }

  /** The session has begun, but nothing may be sent yet. */
  void begin(Loop with, Client of, Views in, Remote at, Alarm by) {
    loop = with;
    client = of;
    views = in;
    remote = at;
    alarm = by;
    commands.begin(with, at);
  }

  /** The client is ready: registers what is to be registered, and gets the settings. */
  void ready() {
    List<Registration> registrations = new ArrayList<>();
    if (client.watches()) {
      registrations.add(
          new Registration("tallystick-files", "workspace/didChangeWatchedFiles", watchers()));
    }
    if (client.registersSettings()) {
      JsonObject section = new JsonObject();
      section.addProperty("section", SECTION);
      registrations.add(
          new Registration("tallystick-settings", "workspace/didChangeConfiguration", section));
    }
    if (!registrations.isEmpty()) {
      remote.registerCapability(new RegistrationParams(registrations));
    }
    loop.post(new Event.Begun());
    pullSettings(null);
    alarm.at(alarm.millis() + Settings.DEFAULT.restMillis(), this::stopWaiting);
  }

  /** A client that has not answered by now may never do so: nothing is set, until it does. */
  private synchronized void stopWaiting() {
    if (!taken) {
      takeSettings(null);
    }
  }

  /**
   * Where a whole folder is deleted, VS Code tells of that only, not of the files that were in it,
   * as the documentation of its createFileSystemWatcher says: so all that is deleted is watched.
   */
  private static DidChangeWatchedFilesRegistrationOptions watchers() {
    return new DidChangeWatchedFilesRegistrationOptions(
        List.of(
            watcher("*.{" + Format.everyExtension() + "}"),
            watcher(ProjectFile.NAME),
            watcher("*.srx"),
            new FileSystemWatcher(Either.forLeft("**"), WatchKind.Delete)));
  }

  private static FileSystemWatcher watcher(String name) {
    return new FileSystemWatcher(Either.forLeft("**/" + name));
  }

  @Override
  public void didChangeConfiguration(DidChangeConfigurationParams params) {
    if (loop != null) {
      pullSettings(params.getSettings());
    }
  }

  /** Asks for the settings, or takes those that came, from a client that cannot be asked. */
  private void pullSettings(Object pushed) {
    if (!client.tellsSettings()) {
      takeSettings(section(pushed));
      return;
    }
    ConfigurationItem item = new ConfigurationItem();
    item.setSection(SECTION);
    remote
        .configuration(new ConfigurationParams(List.of(item)))
        .handle((values, fault) -> values == null || values.isEmpty() ? null : values.get(0))
        .thenAccept(this::takeSettings);
  }

  /** The section within all that was pushed, or the whole if the client sent the section only. */
  private static Object section(Object pushed) {
    boolean within = pushed instanceof JsonObject all && all.has(SECTION);
    return within ? ((JsonObject) pushed).get(SECTION) : pushed;
  }

  /** Called by the thread that reads messages, or by the alarm. */
  private synchronized void takeSettings(Object section) {
    taken = true;
    SettingsReader.Read read = SettingsReader.read(section(client.options()), section);
    if (!read.problems().equals(told)) {
      told = read.problems();
      told.forEach(problem -> remote.showMessage(new MessageParams(MessageType.Warning, problem)));
    }
    loop.post(new Event.SettingsChanged(read.settings()));
    views.lenses().want(read.lens());
    views.hints().want(read.inlay());
  }

  /** Answered at once, with what is known: whoever asks here asks again and again. */
  @Override
  public CompletableFuture<WorkspaceDiagnosticReport> diagnostic(WorkspaceDiagnosticParams params) {
    return requests.ask(() -> board.report(params.getPreviousResultIds()));
  }

  @Override
  public void didChangeWatchedFiles(DidChangeWatchedFilesParams params) {
    List<Path> files = new ArrayList<>();
    boolean listing = false;
    for (FileEvent event : params.getChanges()) {
      Uris.file(event.getUri()).ifPresent(files::add);
      listing |= event.getType() != FileChangeType.Changed;
    }
    if (loop != null && !files.isEmpty()) {
      loop.post(new Event.FilesChanged(files, listing));
    }
  }

  @Override
  public void didChangeWorkspaceFolders(DidChangeWorkspaceFoldersParams params) {
    if (loop != null) {
      List<Path> added = Client.paths(params.getEvent().getAdded());
      List<Path> removed = Client.paths(params.getEvent().getRemoved());
      loop.post(new Event.FoldersChanged(added, removed));
    }
  }

  @Override
  public void didRenameFiles(RenameFilesParams params) {
    Map<Path, Path> names = new HashMap<>();
    for (FileRename rename : params.getFiles()) {
      Optional<Path> before = Uris.file(rename.getOldUri());
      Optional<Path> now = Uris.file(rename.getNewUri());
      if (before.isPresent() && now.isPresent()) {
        names.put(before.get(), now.get());
      }
    }
    if (loop != null && !names.isEmpty()) {
      loop.post(new Event.Renamed(new Renaming(names)));
    }
  }

  @Override
  public CompletableFuture<Object> executeCommand(ExecuteCommandParams params) {
    return commands.execute(params);
  }
}
