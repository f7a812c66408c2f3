package loopwright.view.theme;

import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import java.awt.Font;
import javax.swing.JComponent;
import javax.swing.UIManager;
import javax.swing.plaf.FontUIResource;

/** Light or dark: two looks of one structure. */
public enum Theme {
  LIGHT,
  DARK;

  private static final int FONT_SIZE = 13;

  /**
   * Makes this the look of every component made from now on, and of every window that is open. To
   * be called on the event thread where there is one.
   */
  public void apply() {
    FlatLaf.registerCustomDefaultsSource("loopwright.view.theme");
    FlatInterFont.install();
    // Left alone, the size would differ between a desktop and a virtual display.
    UIManager.put("defaultFont", new FontUIResource(FlatInterFont.FAMILY, Font.PLAIN, FONT_SIZE));
    FlatLaf.setup(this == LIGHT ? new LightLook() : new DarkLook());
    FlatLaf.updateUI();
  }

  /** The other one. */
  public Theme other() {
    return this == LIGHT ? DARK : LIGHT;
  }

  /**
   * Gives a component one of the styles that the theme's properties files name, such as {@code
   * card} or {@code small}; it keeps it when the theme changes.
   *
   * @param styles names of styles, separated by spaces
   * @return the same component
   */
  public static <C extends JComponent> C style(C component, String styles) {
    component.putClientProperty("FlatLaf.styleClass", styles);
    return component;
  }

  /** Shows a text in grey in a field that is empty. */
  public static void placeholder(JComponent field, String text) {
    field.putClientProperty("JTextField.placeholderText", text);
  }

  /** Puts a component at the right end of a text field, inside its border. */
  public static void trailing(JComponent field, JComponent inside) {
    field.putClientProperty("JTextField.trailingComponent", inside);
  }

  /** Marks a field as holding something that cannot be, or as sound again. */
  public static void markWrong(JComponent field, boolean wrong) {
    field.putClientProperty("JComponent.outline", wrong ? "error" : null);
  }
}
