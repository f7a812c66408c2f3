package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Component;
import java.awt.Container;
import java.util.Optional;
import javax.swing.JTabbedPane;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;
import loopwright.predict.HookupPrediction;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The deck as it is painted and as it speaks. */
@ExtendWith(OnEventThread.class)
class PlotDeckTest {
  private static final int WAVEFORM = 2;
  private static final int OVER_SWING = 3;

  private final HookupPrediction growing = SamplePredictions.growing(SampleDesigns.divider(0.5));

  @ParameterizedTest
  @EnumSource(Theme.class)
  void everyTabIsDrawnSmallAndLarge(Theme theme) {
    theme.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(growing), true, "");
    for (int tab = 0; tab < tabs(deck).getTabCount(); tab++) {
      tabs(deck).setSelectedIndex(tab);
      String name = "deck-" + theme + "-" + tab;
      Painting small = Painting.of(deck, 480, 380).save(name + "-small");
      Painting large = Painting.of(deck, 1100, 760).save(name + "-large");
      Color curve = Palette.plot(0);
      assertThat(small.count(curve)).as(name).isGreaterThan(100);
      // Dots keep their size, and the roots are all dots.
      int times = tabs(deck).getTitleAt(tab).equals("Roots") ? 1 : 2;
      assertThat(large.count(curve)).as(name).isGreaterThan(times * small.count(curve));
      assertThat(small.count(Palette.card())).as(name).isGreaterThan(480 * 380 / 4);
    }
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void whatIsOutOfDateIsFadedAndSaysSo(Theme theme) {
    theme.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(growing), false, "the newest edit could not be solved");
    assertThat(text(deck, "note")).isEqualTo("Out of date. The newest edit could not be solved.");
    Painting faded = Painting.of(deck, 480, 380).save("deck-" + theme + "-faded");
    assertThat(faded.count(Palette.plot(0))).isZero();
    deck.show(Optional.of(growing), true, "");
    assertThat(Painting.of(deck, 480, 380).count(Palette.plot(0))).isGreaterThan(100);
    assertThat(named(deck, "note").isVisible()).isFalse();
  }

  @Test
  void aFailedSolveSaysWhyInRed() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(SamplePredictions.failed(SampleDesigns.divider(0.2))), true, "");
    assertThat(text(deck, "title")).isEqualTo("Not solved");
    assertThat(text(deck, "sentence"))
        .isEqualTo("The gain stage saturates: gainOut stands 0.1 V below the positive rail.");
    Painting painting = Painting.of(deck, 480, 380).save("deck-failed");
    assertThat(painting.count(Palette.fails())).isPositive();
    assertThat(painting.count(Palette.plot(0))).isZero();
  }

  @Test
  void aLineNeverEndsBetweenANumberAndItsUnit() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(growing), true, "");
    assertThat(((JTextComponent) named(deck, "title")).getText()).endsWith("11\u00A0MHz");
  }

  @Test
  void withoutAPredictionItSaysTheMessage() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    assertThat(text(deck, "sentence")).isEqualTo("Nothing is solved yet.");
    deck.show(Optional.empty(), true, "open a design to see its plots");
    assertThat(text(deck, "sentence")).isEqualTo("Open a design to see its plots.");
  }

  @Test
  void aTabThatComesToTheFrontShowsTheNewestPrediction() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(SamplePredictions.stable(SampleDesigns.divider(0))), true, "");
    tabs(deck).setSelectedIndex(WAVEFORM);
    assertThat(text(deck, "title")).isEqualTo("No signal");
    deck.show(Optional.of(growing), true, "");
    assertThat(text(deck, "title")).startsWith("gainOut steps over");
    tabs(deck).setSelectedIndex(OVER_SWING);
    assertThat(text(deck, "title")).startsWith("Grows from");
  }

  @Test
  void aPlotSaysItsMeaningToThoseWhoDoNotSeeIt() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(growing), true, "");
    Component canvas = named(deck, "canvas");
    assertThat(canvas.getAccessibleContext().getAccessibleName())
        .isEqualTo("Response: Gain 3.964 up to 11 MHz");
    assertThat(canvas.getAccessibleContext().getAccessibleDescription())
        .startsWith("out over generator");
    assertThat(tabs(deck).getAccessibleContext().getAccessibleName()).isEqualTo("Plots");
  }

  @Test
  void theDeckFollowsAChangeOfTheme() {
    Theme.LIGHT.apply();
    PlotDeck deck = new PlotDeck();
    deck.show(Optional.of(growing), true, "");
    Theme.DARK.apply();
    SwingUtilities.updateComponentTreeUI(deck);
    Painting dark = Painting.of(deck, 480, 380).save("deck-turned-dark");
    assertThat(dark.count(Palette.card())).isGreaterThan(480 * 380 / 4);
    assertThat(dark.count(Palette.plot(0))).isGreaterThan(100);
    assertThat(named(deck, "title").getFont().isBold()).isTrue();
    assertThat(named(deck, "title").getForeground()).isEqualTo(Palette.text());
  }

  private static JTabbedPane tabs(PlotDeck deck) {
    return (JTabbedPane) deck.getComponent(0);
  }

  private static String text(PlotDeck deck, String name) {
    return ((JTextComponent) named(deck, name)).getText().replace('\u00A0', ' ');
  }

  private static Component named(PlotDeck deck, String name) {
    return find((Container) tabs(deck).getSelectedComponent(), name).orElseThrow();
  }

  private static Optional<Component> find(Container container, String name) {
    for (Component part : container.getComponents()) {
      if (name.equals(part.getName())) {
        return Optional.of(part);
      }
      if (part instanceof Container inner && find(inner, name).isPresent()) {
        return find(inner, name);
      }
    }
    return Optional.empty();
  }
}
