package dev.tallystick.engine;

import static java.nio.file.StandardWatchEventKinds.ENTRY_CREATE;
import static java.nio.file.StandardWatchEventKinds.ENTRY_DELETE;
import static java.nio.file.StandardWatchEventKinds.ENTRY_MODIFY;
import static java.nio.file.StandardWatchEventKinds.OVERFLOW;

import dev.tallystick.project.Names;
import dev.tallystick.project.ProjectFile;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Threads;
import java.io.IOException;
import java.nio.file.ClosedWatchServiceException;
import java.nio.file.FileSystems;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.WatchEvent;
import java.nio.file.WatchKey;
import java.nio.file.WatchService;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.RejectedExecutionException;
import java.util.function.Consumer;

/**
 * Watches folders by the means of this machine. Where it cannot, nothing is watched: the files in
 * the editor are followed all the same.
 *
 * <p>One thread waits for what happens; another walks through folders to watch them, which may take
 * long, and alone knows which are watched. What happened before a folder was watched is made up for
 * by having it listed once more.
 */
final class FolderWatch implements Watch {
  private static final Event ANYTHING = new Event.FilesChanged(List.of(), true);

  private final ExecutorService walker =
      Executors.newSingleThreadExecutor(Threads.daemons("tallystick-walker"));
  private final WatchService service;
  private final Consumer<Event> post;
  private final Map<Path, WatchKey> keys = new TreeMap<>();
  private List<Folder> folders = List.of();

  private FolderWatch(WatchService service, Consumer<Event> post) {
    this.service = service;
    this.post = post;
  }

  /** A watch that posts what happens. */
  static Watch open(Consumer<Event> post) {
    try {
      FolderWatch watch = new FolderWatch(FileSystems.getDefault().newWatchService(), post);
      Threads.daemons("tallystick-watch").newThread(watch::run).start();
      return watch;
    } catch (IOException | UnsupportedOperationException e) {
      return new Nothing();
    }
  }

  @Override
  public void over(List<Folder> wanted) {
    List<Folder> copy = List.copyOf(wanted);
    walker.execute(() -> move(copy));
  }

  private void move(List<Folder> wanted) {
    if (wanted.equals(folders)) {
      return;
    }
    folders = wanted;
    keys.entrySet().removeIf(entry -> !isWatched(entry.getKey()) && cancel(entry.getValue()));
    folders.forEach(this::add);
    post.accept(ANYTHING);
  }

  @Override
  public void close() {
    walker.shutdownNow();
    try {
      service.close();
    } catch (IOException e) {
      // It watches nothing any more, in any case.
    }
  }

  private boolean isWatched(Path folder) {
    return folders.stream().anyMatch(watched -> holds(watched, folder));
  }

  /** Whether files right in a folder count. */
  private static boolean holds(Folder watched, Path folder) {
    return folder.equals(watched.path()) || watched.holds(folder) && depth(watched, folder) > 0;
  }

  private static int depth(Folder watched, Path folder) {
    return watched.depth() - (folder.getNameCount() - watched.path().getNameCount());
  }

  private static boolean cancel(WatchKey key) {
    key.cancel();
    return true;
  }

  private void add(Folder folder) {
    try {
      int levels = folder.depth() == Folder.DEEP ? Folder.DEEP : folder.depth() - 1;
      Files.walkFileTree(folder.path(), Set.of(), levels, new Registrar());
    } catch (IOException e) {
      // Without a watch on it, the folder is as it was when it was listed last.
    }
  }

  /** Registers every folder on its way. */
  private final class Registrar extends SimpleFileVisitor<Path> {
    @Override
    public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes) {
      if (isHidden(folder)) {
        return FileVisitResult.SKIP_SUBTREE;
      }
      register(folder);
      return FileVisitResult.CONTINUE;
    }

    @Override
    public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
      if (attributes.isDirectory() && !isHidden(file)) { // as deep as the walk goes
        register(file);
      }
      return FileVisitResult.CONTINUE;
    }

    @Override
    public FileVisitResult visitFileFailed(Path file, IOException e) {
      return FileVisitResult.CONTINUE;
    }

    private void register(Path folder) {
      try {
        keys.put(folder, folder.register(service, ENTRY_CREATE, ENTRY_DELETE, ENTRY_MODIFY));
      } catch (IOException e) {
        // As above.
      }
    }

    private boolean isHidden(Path folder) {
      boolean named = folders.stream().anyMatch(watched -> watched.path().equals(folder));
      return !named && Folder.hides(folder);
    }
  }

  private void run() {
    try {
      while (true) {
        WatchKey key = service.take();
        tell(key);
        key.reset();
      }
    } catch (ClosedWatchServiceException | RejectedExecutionException | InterruptedException e) {
      // Closed.
    }
  }

  private void tell(WatchKey key) {
    List<Path> files = new ArrayList<>();
    boolean listing = false;
    for (WatchEvent<?> event : key.pollEvents()) {
      if (event.kind() == OVERFLOW) {
        post.accept(ANYTHING);
        return;
      }
      Path path = ((Path) key.watchable()).resolve((Path) event.context());
      listing |= event.kind() != ENTRY_MODIFY;
      if (event.kind() == ENTRY_CREATE && Files.isDirectory(path)) {
        walker.execute(() -> addInside(path));
      } else if (event.kind() == ENTRY_DELETE || matters(path.getFileName().toString())) {
        files.add(path);
      }
    }
    if (!files.isEmpty()) {
      post.accept(new Event.FilesChanged(files, listing));
    }
  }

  private static boolean matters(String name) {
    return Format.ofName(name).isPresent() || name.equals(ProjectFile.NAME) || Names.isRules(name);
  }

  /** A folder has appeared in a watched one. */
  private void addInside(Path folder) {
    for (Folder watched : folders) {
      if (holds(watched, folder)) {
        int levels = watched.depth() == Folder.DEEP ? Folder.DEEP : depth(watched, folder);
        add(new Folder(folder, levels));
      }
    }
    post.accept(new Event.FilesChanged(List.of(folder), true));
  }

  /** Where this machine has no means. */
  private record Nothing() implements Watch {
    @Override
    public void over(List<Folder> folders) {}

    @Override
    public void close() {}
  }
}
