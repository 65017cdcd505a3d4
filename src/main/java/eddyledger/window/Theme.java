package eddyledger.window;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import eddyledger.chart.Palette;
import java.awt.Color;
import java.awt.Font;
import java.awt.Insets;
import java.util.Map;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.JFrame;
import javax.swing.UIManager;
import javax.swing.plaf.ColorUIResource;

/** Puts the look in force: palette, fonts and measures of every standard component. */
public final class Theme {
  private static final String PALETTE = "eddyledger.palette";
  private static final String FONTS = "eddyledger.fonts";
  private static final int BODY = 12;

  private Theme() {}

  /** Puts a palette in force; windows already open follow. On the event thread. */
  public static void install(Palette palette) {
    loadFonts();
    FlatLaf.setGlobalExtraDefaults(
        Map.of(
            "@background", hex(palette.ground()),
            "@foreground", hex(palette.ink()),
            "@accentColor", hex(palette.accent()),
            "@disabledForeground", hex(palette.ink3()),
            "@componentBackground", hex(palette.field())));
    boolean changed = UIManager.get(PALETTE) != null;
    if (palette.dark()) {
      FlatDarkLaf.setup();
    } else {
      FlatLightLaf.setup();
    }
    UIManager.put(PALETTE, palette);
    UIManager.put("defaultFont", new Font(FlatInterFont.FAMILY, Font.PLAIN, BODY));
    measures();
    colours(palette);
    JFrame.setDefaultLookAndFeelDecorated(true);
    JDialog.setDefaultLookAndFeelDecorated(true);
    if (changed) {
      FlatLaf.updateUI();
    }
  }

  /** Loads the fonts of the theme, once; may run on any thread. */
  static synchronized void loadFonts() {
    if (UIManager.get(FONTS) == null) {
      FlatInterFont.install();
      UIManager.put(FONTS, Boolean.TRUE);
    }
  }

  private static void measures() {
    for (String arc : new String[] {"Component.arc", "Button.arc", "TextComponent.arc"}) {
      UIManager.put(arc, 4);
    }
    UIManager.put("Component.focusWidth", 0);
    UIManager.put("Component.innerFocusWidth", 1);
    UIManager.put("TextField.margin", new Insets(1, 5, 1, 5));
    UIManager.put("ScrollBar.width", 10);
    UIManager.put("ScrollBar.thumbArc", 999);
    UIManager.put("ScrollBar.showButtons", false);
    UIManager.put("Table.rowHeight", 22);
    UIManager.put("Table.showHorizontalLines", false);
    UIManager.put("Table.showVerticalLines", false);
    UIManager.put("Table.intercellSpacing", new java.awt.Dimension(0, 0));
    UIManager.put("SplitPane.dividerSize", 7);
    UIManager.put("SplitPaneDivider.style", "plain");
    UIManager.put("ToggleButton.tab.underlineHeight", 2);
    UIManager.put("TitlePane.showIcon", false);
    UIManager.put("TitlePane.centerTitle", true);
  }

  private static void colours(Palette palette) {
    put("Component.borderColor", palette.hairline());
    put("ScrollBar.track", palette.paper());
    for (String name : new String[] {"Table.selection", "Table.selectionInactive"}) {
      put(name + "Background", palette.selection());
      put(name + "Foreground", palette.ink());
    }
    put("Table.background", palette.paper());
    put("Table.focusCellBackground", palette.selection());
    put("TableHeader.background", palette.paper());
    put("TableHeader.foreground", palette.ink2());
    put("MenuBar.background", palette.ground());
    put("MenuBar.borderColor", palette.ground());
    put("TitlePane.background", palette.ground());
    put("TitlePane.unifiedBackground", Boolean.TRUE);
    put("ToggleButton.tab.underlineColor", palette.ink());
    put("ToggleButton.tab.disabledUnderlineColor", palette.ink3());
    put("ToggleButton.tab.selectedBackground", palette.paper());
    put("ToggleButton.tab.hoverBackground", palette.ground());
    put("ToggleButton.tab.focusBackground", palette.selection());
    put("ToggleButton.selectedBackground", palette.selection());
    put("ToggleButton.selectedForeground", palette.ink());
    put("RootPane.activeBorderColor", palette.ink3());
    put("RootPane.inactiveBorderColor", palette.hairline());
    put("ToolTip.background", palette.field());
    put("ToolTip.foreground", palette.ink());
  }

  private static void put(String key, Object value) {
    UIManager.put(key, value instanceof Color colour ? new ColorUIResource(colour) : value);
  }

  private static String hex(Color colour) {
    return String.format("#%06x", colour.getRGB() & 0xFFFFFF);
  }

  /** The palette in force; the light one before any was put in force. */
  public static Palette palette() {
    return UIManager.get(PALETTE) instanceof Palette palette ? palette : Palette.LIGHT;
  }

  /** The font of running text and table cells. */
  public static Font body() {
    return plain(BODY);
  }

  /** The font of headers, units, origins, axes and status. */
  public static Font small() {
    return plain(BODY - 1);
  }

  /** The font in a size, regular. */
  public static Font plain(float size) {
    return new Font(FlatInterFont.FAMILY, Font.PLAIN, BODY).deriveFont(size);
  }

  /** The font in a size, semibold: sums, headings, states. */
  public static Font strong(float size) {
    return new Font(FlatInterFont.FAMILY_SEMIBOLD, Font.PLAIN, BODY).deriveFont(size);
  }

  /** Names a component for screen readers and for tests, and gives it back. */
  public static <T extends JComponent> T named(T component, String name, String spoken) {
    component.setName(name);
    component.getAccessibleContext().setAccessibleName(spoken);
    return component;
  }
}
