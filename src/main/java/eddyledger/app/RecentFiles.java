package eddyledger.app;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.prefs.BackingStoreException;
import java.util.prefs.Preferences;

/**
 * The project files that were opened lately, the latest first, kept in the user's preferences. The
 * list is a convenience: if the store is damaged or cannot be written, entries are lost and nothing
 * else.
 */
public final class RecentFiles {
  /** How many are kept. */
  public static final int MOST = 12;

  private static final String NODE = "eddyledger";
  private static final String LIST = "recent";

  private final Preferences store;

  /** In the program's own node of the user's preferences. */
  public RecentFiles() {
    this(NODE);
  }

  /** In a node of the user's preferences, by its path. */
  public RecentFiles(String node) {
    this(Preferences.userRoot().node(node));
  }

  RecentFiles(Preferences node) {
    store = node.node(LIST);
  }

  /** The entries, the latest first; what cannot be read is left out. */
  public List<RecentFile> list() {
    List<RecentFile> files = new ArrayList<>();
    try {
      for (String name : store.childrenNames()) {
        RecentFileStore.read(store.node(name)).ifPresent(files::add);
      }
    } catch (BackingStoreException | IllegalStateException e) {
      return List.of();
    }
    files.sort(Comparator.comparing(RecentFile::opened).reversed());
    List<RecentFile> once = new ArrayList<>();
    for (RecentFile file : files) {
      if (once.size() < MOST && find(once, file.file()).isEmpty()) {
        once.add(file);
      }
    }
    return List.copyOf(once);
  }

  private static Optional<RecentFile> find(List<RecentFile> files, Path path) {
    return files.stream().filter(it -> it.file().equals(path)).findFirst();
  }

  /** Adds a file, or puts it first if it is there already. */
  public void add(RecentFile file) {
    List<RecentFile> files = new ArrayList<>(list());
    files.removeIf(it -> it.file().equals(file.file()));
    files.add(0, file);
    write(files.subList(0, Math.min(MOST, files.size())));
  }

  /** Takes a file off the list; the file itself stays. */
  public void forget(Path file) {
    Path path = file.toAbsolutePath().normalize();
    List<RecentFile> files = new ArrayList<>(list());
    if (files.removeIf(it -> it.file().equals(path))) {
      write(files);
    }
  }

  private void write(List<RecentFile> files) {
    try {
      for (String name : store.childrenNames()) {
        store.node(name).removeNode();
      }
      for (int i = 0; i < files.size(); i++) {
        RecentFileStore.write(files.get(i), store.node(Integer.toString(i)));
      }
      store.flush();
    } catch (BackingStoreException | IllegalStateException | IllegalArgumentException e) {
      // an entry too long for the store, or a store that cannot be written: the list is shorter
      // next time, and the program goes on
      return;
    }
  }
}
