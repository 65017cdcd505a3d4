package eddyledger.window;

import eddyledger.app.RecentFiles;
import java.nio.file.Path;

/** What the start page asks for. */
final class StartActions implements StartView.Actions {
  private final FileCommands files;
  private final RecentFiles recent;
  private final Runnable refresh;

  StartActions(FileCommands files, RecentFiles recent, Runnable refresh) {
    this.files = files;
    this.recent = recent;
    this.refresh = refresh;
  }

  @Override
  public void open(Path file) {
    files.open(file);
  }

  @Override
  public void openExample(String id) {
    files.openExample(id);
  }

  @Override
  public void newEmpty() {
    files.newEmpty();
  }

  @Override
  public void chooseFile() {
    files.chooseFile();
  }

  @Override
  public void forget(Path file) {
    recent.forget(file);
    refresh.run();
  }
}
