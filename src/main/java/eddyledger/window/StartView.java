package eddyledger.window;

import eddyledger.app.Example;
import eddyledger.chart.Palette;
import eddyledger.present.StartPage;
import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.event.HierarchyEvent;
import java.awt.event.KeyEvent;
import java.nio.file.Path;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.ScrollPaneConstants;
import net.miginfocom.swing.MigLayout;

/** The page one starts on: files opened lately, examples, a new vehicle. */
public final class StartView extends JPanel {
  private static final String LIST = "list";
  private static final String EMPTY = "empty";

  /** What the reader can do from here. */
  public interface Actions {
    /** Opens a project file. */
    void open(Path file);

    /** Opens an example by its id. */
    void openExample(String id);

    /** Begins a new, empty vehicle. */
    void newEmpty();

    /** Lets the reader choose a file to open. */
    void chooseFile();

    /** Takes a file off the list of recent ones. */
    void forget(Path file);
  }

  private final transient Actions actions;
  private final JLabel name = label(StartPage.NAME, "start.name");
  private final JLabel sentence = label(StartPage.SENTENCE, "start.sentence");
  private final JLabel recentHeading = label("Recent", "start.recent-heading");
  private final JLabel examplesHeading = label("Examples, all invented", "start.examples-heading");
  private final JLabel nothing = label(StartPage.NOTHING_RECENT, "start.nothing-recent");
  private final JLabel keys =
      label("Enter opens, Delete takes a file off the list.", "start.recent-keys");
  private final JLabel drop = label(StartPage.DROP, "start.drop");
  private final JTextArea caution = new JTextArea(StartPage.caution());
  private final RecentList recent;
  private final JScrollPane scroll;
  private final CardLayout cards = new CardLayout();
  private final JPanel files = new JPanel(cards);
  private final JPanel examples =
      new JPanel(new MigLayout("insets 0, wrap 1, gapy 8", "[grow,fill]"));

  /** An empty page with what its reader can do. */
  public StartView(Actions actions) {
    super(new BorderLayout());
    this.actions = actions;
    recent = new RecentList(actions::open, actions::forget);
    scroll =
        new JScrollPane(
            recent,
            ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
            ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(RecentCell.HEIGHT);
    Theme.named(this, "start", "Start page");
    // list and text area have handlers of their own, which would keep a dropped file to themselves
    for (JComponent target : new JComponent[] {this, recent, caution}) {
      target.setTransferHandler(new FileDrop(actions::open));
    }
    addHierarchyListener(
        event -> {
          boolean showing = (event.getChangeFlags() & HierarchyEvent.SHOWING_CHANGED) != 0;
          if (showing && isShowing()) {
            requestFocusInWindow();
          }
        });
    add(page(), BorderLayout.CENTER);
    colours();
  }

  private static JLabel label(String text, String name) {
    return Theme.named(new JLabel(text), name, text);
  }

  private JPanel page() {
    files.setOpaque(false);
    files.add(scroll, LIST);
    JPanel empty = new JPanel(new MigLayout("insets 12 0 0 0"));
    empty.setOpaque(false);
    empty.add(nothing);
    files.add(empty, EMPTY);
    examples.setOpaque(false);
    caution.setEditable(false);
    caution.setFocusable(false);
    caution.setLineWrap(true);
    caution.setWrapStyleWord(true);
    caution.setOpaque(false);
    caution.setBorder(BorderFactory.createEmptyBorder());
    Theme.named(caution, "start.caution", StartPage.caution());
    JPanel inner =
        new JPanel(
            new MigLayout(
                "insets 32 24 24 24, gap 0, hidemode 3",
                "[360:640:640,grow 100,shrink 100]16:72:72[300:456:456,grow 100,shrink 100]",
                "[]4[]36[]8[]8[]24[]4[]"));
    inner.setOpaque(false);
    inner.add(name);
    inner.add(buttons(), "spany 2, right, top, wrap");
    inner.add(sentence, "wrap");
    inner.add(recentHeading);
    inner.add(examplesHeading, "wrap");
    inner.add(files, "growx, top, hmin 66, shrinkprioy 200");
    inner.add(examples, "growx, top, wrap");
    inner.add(keys, "wrap");
    inner.add(drop, "span, wrap");
    inner.add(caution, "span, growx, wmin 0");
    JPanel centred =
        new JPanel(new MigLayout("insets 0, fill", "[center]", "[0::,grow 38]0[]0[0::,grow 62]"));
    centred.setOpaque(false);
    // a little above the middle, where a page looks balanced
    centred.add(inner, "cell 0 1, wmin 0, hmin 0");
    return centred;
  }

  private JPanel buttons() {
    JPanel buttons = new JPanel(new MigLayout("insets 0, gapx 8"));
    buttons.setOpaque(false);
    JButton empty = Theme.named(new JButton("New, empty"), "start.new", "New empty vehicle");
    empty.setMnemonic(KeyEvent.VK_N);
    empty.addActionListener(event -> actions.newEmpty());
    JButton open = Theme.named(new JButton("Open…"), "start.open", "Open a project file");
    open.setMnemonic(KeyEvent.VK_O);
    open.addActionListener(event -> actions.chooseFile());
    buttons.add(empty, "h 27!");
    buttons.add(open, "h 27!");
    return buttons;
  }

  /** Shows a page. */
  public void show(StartPage page) {
    recent.show(page.recent());
    keys.setVisible(!page.recent().isEmpty());
    cards.show(files, page.recent().isEmpty() ? EMPTY : LIST);
    examples.removeAll();
    for (Example example : page.examples()) {
      ExampleCard card = new ExampleCard(example);
      card.addActionListener(event -> actions.openExample(example.id()));
      examples.add(card);
    }
    examples.revalidate();
    examples.repaint();
  }

  @Override
  public boolean requestFocusInWindow() {
    return recent.getModel().getSize() > 0
        ? recent.requestFocusInWindow()
        : super.requestFocusInWindow();
  }

  private void colours() {
    Palette palette = Theme.palette();
    setBackground(palette.paper());
    if (scroll == null) {
      return;
    }
    name.setFont(Theme.strong(26f));
    sentence.setFont(Theme.plain(13f));
    sentence.setForeground(palette.ink2());
    recentHeading.setFont(Theme.strong(13f));
    examplesHeading.setFont(Theme.strong(13f));
    nothing.setForeground(palette.ink2());
    for (JLabel small : new JLabel[] {keys, drop}) {
      small.setFont(Theme.small());
      small.setForeground(palette.ink2());
    }
    caution.setFont(Theme.small());
    caution.setForeground(palette.ink2());
    recent.setBackground(palette.paper());
    scroll.getViewport().setBackground(palette.paper());
  }

  @Override
  public void updateUI() {
    super.updateUI();
    colours();
  }
}
