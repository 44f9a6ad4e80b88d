package dev.tallystick.engine;

import dev.tallystick.pairing.Language;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Everything that can happen to the loop. The set is closed: nothing else changes its state. */
public sealed interface Event {
  /**
   * The editor shows a file; from now on its text counts, not the disk's.
   *
   * @param file the file, which need not exist yet
   * @param uri how the editor names it, kept as it is
   * @param version the editor's number for the text
   * @param language what the editor takes it for, as LSP names it; may be empty
   * @param text the text in the editor
   */
  record Opened(Path file, String uri, int version, String language, Text text) implements Event {}

  /**
   * A text was edited in the editor.
   *
   * @param file the file
   * @param uri how the editor names it
   * @param version the editor's number for the text after all changes
   * @param changes one after the other, each seeing the text that the one before left
   */
  record Edited(Path file, String uri, int version, List<Change> changes) implements Event {}

  /** The editor saved a file. */
  record Saved(Path file) implements Event {}

  /** The editor no longer shows a file; the disk counts again. */
  record Closed(Path file) implements Event {}

  /**
   * Another program, or the editor, wrote to the disk.
   *
   * @param files those that changed; none if any may have
   * @param listing whether files may have appeared or vanished
   */
  record FilesChanged(List<Path> files, boolean listing) implements Event {}

  /** The workspace has other folders now. */
  record FoldersChanged(List<Path> added, List<Path> removed) implements Event {}

  /**
   * The editor is ready: the work starts, by default settings. What settings may answer, the user
   * is not asked before the first of them.
   */
  record Begun() implements Event {}

  /** The user's settings are these now; the work starts with them at the latest. */
  record SettingsChanged(Settings settings) implements Event {}

  /**
   * The user says that two files belong together.
   *
   * @param source the source
   * @param target its translation
   * @param sourceLanguage its language, if the user names it
   * @param targetLanguage its language, if the user names it
   */
  record Paired(
      Path source,
      Path target,
      Optional<Language> sourceLanguage,
      Optional<Language> targetLanguage)
      implements Event {}

  /** The user says that a translation, or all of a source, are finished, or drafts again. */
  record Marked(Path file, boolean finished) implements Event {}

  /** The user wants all pairs looked at: those of one folder, or of all. */
  record FolderWanted(Optional<Path> folder) implements Event {}

  /** The user wants only the open pairs looked at, and no more of the others. */
  record FoldersDeclined() implements Event {}

  /** Files or folders have other names now. */
  record Renamed(Renaming renaming) implements Event {}

  /**
   * A worker is done with a pair.
   *
   * @param task what it was given
   * @param result what came out; empty if the task was cancelled or failed
   * @param fault the class and place of a fault of our own; never text of a file
   */
  record Examined(Task task, Optional<PairResult> result, Optional<String> fault)
      implements Event {}

  /**
   * A worker has listed a folder.
   *
   * @param troubles what in it cannot be looked into, and why, for the log
   */
  record Listed(Path folder, List<Path> files, List<String> troubles) implements Event {}

  /** A moment has come that someone waits for. Who, the state tells. */
  record TimerDue() implements Event {}

  /** The editor asks about a place. */
  record Asked(Question question) implements Event {}

  /** Nobody waits for an answer any more. */
  record Withdrawn(Question question) implements Event {}
}
