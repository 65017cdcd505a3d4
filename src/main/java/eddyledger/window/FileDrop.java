package eddyledger.window;

import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.TransferHandler;

/** Lets project files be dropped on a component: the first of them is opened. */
public final class FileDrop extends TransferHandler {
  private static final String ENDING = ".eddyledger";

  private final transient Consumer<Path> open;

  /** With what opens a file. */
  public FileDrop(Consumer<Path> open) {
    this.open = open;
  }

  @Override
  public boolean canImport(TransferSupport support) {
    return support.isDrop() && support.isDataFlavorSupported(DataFlavor.javaFileListFlavor);
  }

  @Override
  public boolean importData(TransferSupport support) {
    if (!canImport(support)) {
      return false;
    }
    try {
      Object data = support.getTransferable().getTransferData(DataFlavor.javaFileListFlavor);
      Optional<Path> project = data instanceof List<?> files ? project(files) : Optional.empty();
      project.ifPresent(open);
      return project.isPresent();
    } catch (UnsupportedFlavorException | IOException e) {
      // the other program took its offer back; nothing was dropped
      return false;
    }
  }

  /** The first project file among some files. */
  static Optional<Path> project(List<?> files) {
    return files.stream()
        .filter(File.class::isInstance)
        .map(file -> ((File) file).toPath())
        .filter(path -> path.toString().toLowerCase(Locale.ROOT).endsWith(ENDING))
        .findFirst();
  }
}
