package eddyledger.window;

import eddyledger.chart.ChartStyle;
import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.chart.Picture;
import eddyledger.chart.PicturePanel;
import eddyledger.chart.Pictures;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.present.PicturePresenter;
import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Insets;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.ButtonGroup;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JToggleButton;
import javax.swing.SwingConstants;
import net.miginfocom.swing.MigLayout;

/** The picture of the selection under its heading, with a switch for the kinds of picture. */
final class PictureView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int TAB_PAD = 24;
  private static final String DRAWN = "drawn";
  private static final String ABSENT = "absent";

  private final transient PicturePresenter presenter;
  private final JLabel heading = new JLabel();
  private final JLabel subHeading =
      Theme.named(new JLabel(), "picture.words", "What the picture shows");
  private final Map<Picture, JToggleButton> tabs = new EnumMap<>(Picture.class);
  private final JButton whole;
  private final PicturePanel picture = Theme.named(new PicturePanel(), "picture", "Picture");
  private final JLabel absence = new JLabel("", SwingConstants.CENTER);
  private final CardLayout cards = new CardLayout();
  private final JPanel content = new JPanel(cards);
  private transient Drawn drawn;

  /** What a picture is drawn from; while it stays the same the picture does. */
  private record Drawn(Picture kind, ReceiverSheet sheet, String row, Palette palette) {
    boolean sameAs(Drawn other) {
      return other != null
          && kind == other.kind
          && sheet == other.sheet
          && row.equals(other.row)
          && palette == other.palette;
    }
  }

  PictureView(PicturePresenter presenter, Runnable wholeDesk) {
    super(new BorderLayout());
    this.presenter = presenter;
    JPanel head =
        new JPanel(new MigLayout("insets 2 12 0 10, fillx, h 32!", "[]10[0:200:,grow]8[]2[]8[]"));
    head.setOpaque(false);
    head.add(heading);
    head.add(subHeading, "wmin 0, growx");
    ButtonGroup group = new ButtonGroup();
    for (Picture kind : Picture.values()) {
      JToggleButton tab = new JToggleButton(kind.word());
      Theme.named(tab, "picture." + kind.word().toLowerCase(), kind.heading());
      tab.putClientProperty("JButton.buttonType", "tab");
      tab.setMargin(new Insets(2, 8, 2, 8));
      tab.addActionListener(event -> presenter.choose(kind));
      group.add(tab);
      tabs.put(kind, tab);
      double width = Digits.width(Theme.strong(12), kind.word());
      head.add(tab, "h 26!, w " + ((int) Math.ceil(width) + TAB_PAD) + "!");
    }
    whole = Theme.named(new JButton(new WholeIcon()), "picture.whole", "Picture on the whole desk");
    whole.setToolTipText("On the whole desk, and back (Ctrl+Shift+3)");
    whole.putClientProperty("JButton.buttonType", "toolBarButton");
    whole.addActionListener(event -> wholeDesk.run());
    head.add(whole, "w 26!, h 26!");
    content.setOpaque(false);
    content.setBorder(BorderFactory.createEmptyBorder(4, 10, 2, 8));
    content.add(picture, DRAWN);
    content.add(absence, ABSENT);
    add(head, BorderLayout.NORTH);
    add(content, BorderLayout.CENTER);
    presenter.onChange(this::refresh);
    updateUI();
  }

  private void refresh() {
    heading.setText(presenter.picture().heading());
    String words = presenter.subHeading();
    subHeading.setText(words);
    subHeading.setToolTipText(words);
    tabs.get(presenter.picture()).setSelected(true);
    tabs.forEach(
        (kind, tab) -> tab.setFont(kind == presenter.picture() ? Theme.strong(12) : Theme.body()));
    Optional<ReceiverSheet> sheet = presenter.sheet();
    if (sheet.isPresent()) {
      Drawn wanted = new Drawn(presenter.picture(), sheet.get(), presenter.row(), Theme.palette());
      if (!wanted.sameAs(drawn)) {
        drawn = wanted;
        ChartStyle style = new ChartStyle(wanted.palette(), Theme.body());
        Pictures.show(picture, wanted.kind(), wanted.sheet(), wanted.row(), style);
      }
      cards.show(content, DRAWN);
    } else {
      absence.setText(presenter.absence());
      cards.show(content, ABSENT);
    }
  }

  @Override
  public void updateUI() {
    super.updateUI();
    if (heading != null) {
      Palette palette = Theme.palette();
      setBackground(palette.paper());
      heading.setFont(Theme.strong(13));
      subHeading.setFont(Theme.small());
      subHeading.setForeground(palette.ink2());
      absence.setForeground(palette.ink2());
      refresh();
    }
  }
}
