package eddyledger.bench;

import com.formdev.flatlaf.FlatLightLaf;
import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import java.awt.Font;
import javax.swing.JFrame;
import javax.swing.JLabel;
import javax.swing.SwingUtilities;
import javax.swing.UIManager;
import javax.swing.WindowConstants;

/** A window of the program's theme, font and size with one label in it: what starting costs. */
final class BareWindow {
  private BareWindow() {}

  public static void main(String[] arguments) {
    SwingUtilities.invokeLater(
        () -> {
          FlatInterFont.install();
          FlatLightLaf.setup();
          UIManager.put("defaultFont", new Font(FlatInterFont.FAMILY, Font.PLAIN, 12));
          JFrame.setDefaultLookAndFeelDecorated(true);
          JFrame frame = new JFrame("Bare window");
          frame.setDefaultCloseOperation(WindowConstants.EXIT_ON_CLOSE);
          frame.add(new JLabel("Bare"));
          frame.setSize(1440, 900);
          frame.setVisible(true);
        });
  }
}
