package eddyledger.window;

import eddyledger.present.TraceAccount;
import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Toolkit;
import java.awt.datatransfer.StringSelection;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import java.util.function.IntConsumer;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.ButtonGroup;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.JToggleButton;
import javax.swing.KeyStroke;
import net.miginfocom.swing.MigLayout;

/**
 * The trace of one contribution over the whole window: stage by stage with rule, numbers, picture
 * and running level, and the table of all numbers.
 */
public final class TraceView extends JPanel {
  private static final String STEPS = "steps";
  private static final String NUMBERS = "numbers";
  private static final String REASON = "reason";

  private final transient Runnable back;
  private transient IntConsumer onBand = band -> {};
  private transient TraceAccount account;
  private boolean filling;

  private final JLabel title = Theme.named(new JLabel(" "), "trace.title", "Trace");
  private final JLabel subtitle = Theme.named(new JLabel(" "), "trace.subtitle", "Summary");
  private final JComboBox<String> bands =
      Theme.named(
          new JComboBox<>(TraceAccount.bandNames().toArray(String[]::new)),
          "trace.band",
          "Follow band");
  private final JButton copy =
      Theme.named(new JButton("Copy as text"), "trace.copy", "Copy the trace as text");
  private final JToggleButton steps =
      Theme.named(new JToggleButton("Step by step"), "trace.show-steps", "Show step by step");
  private final JToggleButton all =
      Theme.named(new JToggleButton("All numbers"), "trace.show-numbers", "Show all numbers");
  private final TraceHeading heading = new TraceHeading();
  private final TracePage page = new TracePage();
  private final JScrollPane scroll = new JScrollPane(page);
  private final TraceTable table = new TraceTable();
  private final TraceFooter footer = new TraceFooter();
  private final JTextArea reason = Theme.named(new JTextArea(), "trace.reason", "Reason");
  private final CardLayout cards = new CardLayout();
  private final JPanel middle = new JPanel(cards);

  /**
   * An empty view.
   *
   * @param back takes the reader back to the desk
   */
  public TraceView(Runnable back) {
    super(new BorderLayout());
    this.back = back;
    Theme.named(this, "trace", "Trace of a contribution");
    add(top(), BorderLayout.NORTH);
    add(middle(), BorderLayout.CENTER);
    add(footer, BorderLayout.SOUTH);
    keys();
    colours();
  }

  private JPanel top() {
    JPanel top =
        new JPanel(
            new MigLayout(
                "insets 10 24 4 24, gapx 8, gapy 2", "[grow,shrink,0:pref:]push[][]16[][]16[][]"));
    top.setOpaque(false);
    JLabel follow = new JLabel("Follow band");
    follow.setLabelFor(bands);
    follow.setDisplayedMnemonic(KeyEvent.VK_F);
    follow.setName("trace.band-label");
    JButton desk = Theme.named(new JButton("Back to the desk"), "trace.back", "Back to the desk");
    desk.setToolTipText("Escape");
    desk.setMnemonic(KeyEvent.VK_B);
    desk.addActionListener(event -> back.run());
    copy.setMnemonic(KeyEvent.VK_C);
    copy.addActionListener(event -> copy());
    steps.setMnemonic(KeyEvent.VK_S);
    all.setMnemonic(KeyEvent.VK_A);
    ButtonGroup group = new ButtonGroup();
    group.add(steps);
    group.add(all);
    steps.setSelected(true);
    steps.addActionListener(event -> card());
    all.addActionListener(event -> card());
    bands.setToolTipText("Left and right in the steps, or a click on a bar, choose it as well");
    bands.setMaximumRowCount(bands.getItemCount());
    bands.addActionListener(event -> choose());
    top.add(title, "growx, wmin 0");
    top.add(follow);
    top.add(bands, "w 96!");
    top.add(steps);
    top.add(all, "gapx 0");
    top.add(copy);
    top.add(desk, "wrap");
    top.add(subtitle, "span, wmin 0");
    return top;
  }

  private JPanel middle() {
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.setColumnHeaderView(heading);
    scroll.getVerticalScrollBar().setUnitIncrement(24);
    scroll
        .getViewport()
        .addChangeListener(event -> footer.columnsWidth(scroll.getViewport().getWidth()));
    reason.setEditable(false);
    reason.setLineWrap(true);
    reason.setWrapStyleWord(true);
    reason.setBorder(BorderFactory.createEmptyBorder(24, 24, 24, 24));
    middle.setOpaque(false);
    middle.add(new SoftEdge(scroll), STEPS);
    middle.add(table.scrolled(), NUMBERS);
    middle.add(reason, REASON);
    return middle;
  }

  private void keys() {
    getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT)
        .put(KeyStroke.getKeyStroke(KeyEvent.VK_ESCAPE, 0), "back");
    getActionMap()
        .put(
            "back",
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                back.run();
              }
            });
  }

  /** Called with the position 0 .. 27 of a band that the reader wants to follow. */
  public void onBand(IntConsumer listener) {
    onBand = listener;
  }

  /** Shows an account. */
  public void show(TraceAccount shown) {
    account = shown;
    filling = true;
    bands.setSelectedIndex(shown.band());
    filling = false;
    title.setText(shown.title());
    title.setToolTipText(shown.title());
    subtitle.setText(shown.subtitle());
    heading.show(shown.axis());
    page.show(shown, band -> onBand.accept(band));
    table.show(shown.numbers());
    footer.show(shown.total());
    reason.setText(shown.reason());
    bands.setEnabled(shown.hasValue());
    steps.setEnabled(shown.hasValue());
    all.setEnabled(shown.hasValue());
    card();
  }

  private void card() {
    boolean value = account != null && account.hasValue();
    cards.show(middle, !value ? REASON : all.isSelected() ? NUMBERS : STEPS);
  }

  private void choose() {
    if (!filling && account != null && bands.getSelectedIndex() != account.band()) {
      onBand.accept(bands.getSelectedIndex());
    }
  }

  private void copy() {
    if (account != null) {
      Toolkit.getDefaultToolkit()
          .getSystemClipboard()
          .setContents(new StringSelection(account.text()), null);
      subtitle.setText("Copied to the clipboard, with all numbers and the cautions.");
    }
  }

  private void colours() {
    setBackground(Theme.palette().paper());
    if (title == null) {
      return;
    }
    title.setFont(Theme.strong(18f));
    subtitle.setFont(Theme.body());
    subtitle.setForeground(Theme.palette().ink2());
    reason.setFont(Theme.body());
    reason.setBackground(Theme.palette().paper());
    reason.setForeground(Theme.palette().ink());
    scroll.getViewport().setBackground(Theme.palette().paper());
  }

  @Override
  public void updateUI() {
    super.updateUI();
    colours();
  }
}
