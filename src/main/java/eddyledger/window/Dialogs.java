package eddyledger.window;

import java.awt.Component;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;

/** Asks and tells the user, in dialogs. */
final class Dialogs {
  /** What to do with unsaved work. */
  enum Unsaved {
    SAVE,
    DISCARD,
    CANCEL
  }

  private final Component parent;
  private Path folder;

  Dialogs(Component parent) {
    this.parent = parent;
  }

  /** Remembers in which folder to begin. */
  void beginAt(Path file) {
    Path absolute = file.toAbsolutePath();
    folder = Files.isDirectory(absolute) ? absolute : absolute.getParent();
  }

  /** Asks for a file to open. */
  Optional<Path> open(String title, String what, String extension) {
    JFileChooser chooser = chooser(title, what, extension);
    return chooser.showOpenDialog(parent) == JFileChooser.APPROVE_OPTION
        ? chosen(chooser)
        : Optional.empty();
  }

  /** Asks for a file to write; asks again before another file is overwritten. */
  Optional<Path> save(String title, String what, String extension, String suggestion) {
    JFileChooser chooser = chooser(title, what, extension);
    chooser.setSelectedFile(
        (folder == null ? Path.of("").toAbsolutePath() : folder).resolve(suggestion).toFile());
    while (chooser.showSaveDialog(parent) == JFileChooser.APPROVE_OPTION) {
      Path file = withExtension(chosen(chooser).orElseThrow(), extension);
      if (!Files.exists(file) || overwrite(file)) {
        return Optional.of(file);
      }
    }
    return Optional.empty();
  }

  private static Path withExtension(Path file, String extension) {
    String name = String.valueOf(file.getFileName());
    return name.contains(".") ? file : file.resolveSibling(name + "." + extension);
  }

  private JFileChooser chooser(String title, String what, String extension) {
    JFileChooser chooser = new JFileChooser(folder == null ? null : folder.toFile());
    chooser.setName("file-chooser");
    chooser.setDialogTitle(title);
    chooser.setFileFilter(new FileNameExtensionFilter(what + " (." + extension + ")", extension));
    return chooser;
  }

  private Optional<Path> chosen(JFileChooser chooser) {
    Path file = chooser.getSelectedFile().toPath();
    beginAt(file);
    return Optional.of(file);
  }

  private boolean overwrite(Path file) {
    return ask(
            "Overwrite the file?",
            file.getFileName() + " is there already. What it holds now would be lost.",
            "Overwrite",
            "Choose another")
        == 0;
  }

  /** Asks whether to write over what somebody else wrote since the file was opened. */
  boolean writeOverOthers(Path file) {
    return ask(
            "The file was changed by another program",
            file.getFileName()
                + " was written since you opened it. Saving replaces what is in it now.",
            "Replace",
            "Do not save")
        == 0;
  }

  /** Asks what to do with unsaved work. */
  Unsaved unsaved(String name) {
    int answer =
        ask(
            "Save the changes?",
            "The changes to " + name + " are in no file yet.",
            "Save",
            "Discard",
            "Cancel");
    return answer == 0 ? Unsaved.SAVE : answer == 1 ? Unsaved.DISCARD : Unsaved.CANCEL;
  }

  /** Asks; the answer that loses nothing is the default: the last of two, the first of three. */
  private int ask(String title, String text, String... answers) {
    return JOptionPane.showOptionDialog(
        parent,
        Wrapped.text(text),
        title,
        JOptionPane.DEFAULT_OPTION,
        JOptionPane.QUESTION_MESSAGE,
        null,
        answers,
        answers.length == 2 ? answers[1] : answers[0]);
  }

  /** Tells what went wrong. */
  void complain(String title, String text) {
    JOptionPane.showMessageDialog(parent, Wrapped.text(text), title, JOptionPane.ERROR_MESSAGE);
  }

  /** Tells something. */
  void tell(String title, String text) {
    JOptionPane.showMessageDialog(parent, Wrapped.text(text), title, JOptionPane.PLAIN_MESSAGE);
  }
}
