package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Container;
import java.awt.Point;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.dnd.DnDConstants;
import java.awt.dnd.DropTarget;
import java.awt.dnd.DropTargetDragEvent;
import java.awt.dnd.DropTargetDropEvent;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.SwingUtilities;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.Test;

/** A file dropped anywhere on the window is opened. */
@WindowTest
class DropFlowTest extends WindowFlow {
  private record Load(List<File> files) implements Transferable {
    @Override
    public DataFlavor[] getTransferDataFlavors() {
      return new DataFlavor[] {DataFlavor.javaFileListFlavor};
    }

    @Override
    public boolean isDataFlavorSupported(DataFlavor flavor) {
      return flavor.equals(DataFlavor.javaFileListFlavor);
    }

    @Override
    public Object getTransferData(DataFlavor flavor) {
      return files;
    }
  }

  /** A drop as the desktop would announce it. */
  private static final class Drop extends DropTargetDropEvent {
    private static final long serialVersionUID = 1L;
    private final transient Transferable load;

    Drop(DropTarget target, Transferable load) {
      super(
          target.getDropTargetContext(),
          new Point(1, 1),
          DnDConstants.ACTION_COPY,
          DnDConstants.ACTION_COPY);
      this.load = load;
    }

    @Override
    public Transferable getTransferable() {
      return load;
    }

    @Override
    public boolean isDataFlavorSupported(DataFlavor flavor) {
      return load.isDataFlavorSupported(flavor);
    }

    @Override
    public DataFlavor[] getCurrentDataFlavors() {
      return load.getTransferDataFlavors();
    }

    @Override
    public void acceptDrop(int action) {}

    @Override
    public void rejectDrop() {}

    @Override
    public void dropComplete(boolean success) {}
  }

  private static final class Hover extends DropTargetDragEvent {
    private static final long serialVersionUID = 1L;
    private final transient Transferable load;

    Hover(DropTarget target, Transferable load) {
      super(
          target.getDropTargetContext(),
          new Point(1, 1),
          DnDConstants.ACTION_COPY,
          DnDConstants.ACTION_COPY);
      this.load = load;
    }

    @Override
    public Transferable getTransferable() {
      return load;
    }

    @Override
    public boolean isDataFlavorSupported(DataFlavor flavor) {
      return load.isDataFlavorSupported(flavor);
    }

    @Override
    public DataFlavor[] getCurrentDataFlavors() {
      return load.getTransferDataFlavors();
    }

    @Override
    public void acceptDrag(int action) {}

    @Override
    public void rejectDrag() {}
  }

  /** The component that a drop on another would go to: the nearest around it that takes drops. */
  private static DropTarget target(Component over) {
    Container around = over instanceof Container self ? self : over.getParent();
    while (around != null && around.getDropTarget() == null) {
      around = around.getParent();
    }
    return around == null ? null : around.getDropTarget();
  }

  private void drop(Component over, Path file) {
    GuiActionRunner.execute(
        () -> {
          DropTarget target = target(over);
          Transferable load = new Load(List.of(file.toFile()));
          target.dragEnter(new Hover(target, load));
          target.drop(new Drop(target, load));
        });
    harness.robot().waitForIdle();
  }

  @Test
  void onTheStartPageAndOnEveryRegionOfTheDesk() throws IOException {
    Path example = Harness.example(folder);
    drop(hands.showing(StartView.class).get(0), example);
    harness.until("it is open", () -> hands.title().startsWith("quillon-82.eddyledger"));
    harness.ready();
    for (String name : new String[] {"ledger", "sheet.name", "picture", "sheet.level"}) {
      Path next = folder.resolve(name + "-dropped.eddyledger");
      Files.copy(example, next);
      Component over =
          hands.showing(JComponent.class).stream()
              .filter(c -> name.equals(c.getName()))
              .findFirst()
              .orElseThrow();
      drop(over, next);
      harness.until("dropped on " + name, () -> hands.title().startsWith(name + "-dropped"));
      harness.ready();
    }
  }

  @Test
  void unsavedWorkIsAskedAboutFirst() throws IOException {
    Path example = Harness.example(folder);
    harness.openByDialog(example);
    harness.clickRow("crown-a");
    hands.change("count", "7");
    Path next = Files.copy(example, folder.resolve("next.eddyledger"));
    SwingUtilities.invokeLater(() -> later(next));
    hands.answer("Cancel");
    assertThat(hands.title()).startsWith("quillon-82.eddyledger, changed");
    assertThat(hands.field("count")).isEqualTo("7");
  }

  private void later(Path file) {
    DropTarget target = target(hands.showing(PictureView.class).get(0));
    Transferable load = new Load(List.of(file.toFile()));
    target.dragEnter(new Hover(target, load));
    target.drop(new Drop(target, load));
  }
}
