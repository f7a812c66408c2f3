package loopwright.view.theme;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Font;
import java.util.HashSet;
import java.util.Set;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JToggleButton;
import javax.swing.UIManager;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Both looks can be read. */
class ThemeTest {
  /** Contrast of text against its ground: WCAG 2.1, success criterion 1.4.3. */
  private static final double LEAST_TEXT_CONTRAST = 4.5;

  /** Contrast of graphics against their ground: WCAG 2.1, success criterion 1.4.11. */
  private static final double LEAST_LINE_CONTRAST = 3;

  @ParameterizedTest
  @EnumSource(Theme.class)
  void textsCanBeRead(Theme theme) {
    theme.apply();
    for (Color text :
        new Color[] {
          Palette.text(), Palette.quiet(), Palette.accent(), Palette.fails(), Palette.risky()
        }) {
      assertThat(contrast(text, Palette.card())).isGreaterThan(LEAST_TEXT_CONTRAST);
    }
    assertThat(contrast(Palette.text(), Palette.accentGround())).isGreaterThan(LEAST_TEXT_CONTRAST);
    assertThat(contrast(Palette.fails(), Palette.failsGround())).isGreaterThan(LEAST_TEXT_CONTRAST);
    assertThat(contrast(Palette.quiet(), Palette.ground())).isGreaterThan(LEAST_TEXT_CONTRAST);
    assertThat(contrast(Palette.wire(), Palette.card())).isGreaterThan(LEAST_LINE_CONTRAST);
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void theFirstThreeCurvesStandOutFromTheirGroundAndNoTwoAreAlike(Theme theme) {
    theme.apply();
    Set<Color> colours = new HashSet<>();
    for (int i = 0; i < Palette.PLOT_COLOURS; i++) {
      colours.add(Palette.plot(i));
    }
    assertThat(colours).hasSize(Palette.PLOT_COLOURS);
    for (int i = 0; i < 3; i++) {
      assertThat(contrast(Palette.plot(i), Palette.card())).isGreaterThan(LEAST_LINE_CONTRAST);
    }
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void oneFontInThreeSizes(Theme theme) {
    theme.apply();
    assertThat(Palette.normal().getFamily()).isEqualTo("Inter");
    assertThat(Palette.small().getFamily()).isEqualTo("Inter");
    assertThat(Palette.title().getFamily()).isEqualTo("Inter");
    assertThat(Palette.small().getSize()).isEqualTo(11);
    assertThat(Palette.normal().getSize()).isEqualTo(13);
    assertThat(Palette.title().getSize()).isEqualTo(16);
    assertThat(Palette.strong().getStyle()).isEqualTo(Font.BOLD);
  }

  @Test
  void aStyleHoldsInEitherTheme() {
    Theme.LIGHT.apply();
    JPanel card = Theme.style(new JPanel(), "card");
    JLabel caption = Theme.style(new JLabel("figures"), "caption");
    JToggleButton pill = Theme.style(new JToggleButton("divider"), "pill");
    assertThat(card.getBackground()).isEqualTo(Palette.card());
    assertThat(caption.getFont().getSize()).isEqualTo(11);
    assertThat(pill.getBackground()).isEqualTo(Palette.card());
    Theme.LIGHT.other().apply();
    card.updateUI();
    assertThat(card.getBackground()).isEqualTo(Palette.card());
    assertThat(UIManager.getLookAndFeel().getName()).isEqualTo("Loopwright dark");
  }

  private static double contrast(Color one, Color other) {
    double bright = Math.max(luminance(one), luminance(other));
    double dim = Math.min(luminance(one), luminance(other));
    return (bright + 0.05) / (dim + 0.05);
  }

  /** Relative luminance as WCAG 2.1 defines it. */
  private static double luminance(Color colour) {
    return 0.2126 * linear(colour.getRed())
        + 0.7152 * linear(colour.getGreen())
        + 0.0722 * linear(colour.getBlue());
  }

  private static double linear(int channel) {
    double share = channel / 255.0;
    return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }
}
