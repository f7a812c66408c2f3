package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.image.BufferedImage;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javax.swing.JPanel;
import loopwright.check.Finding;
import loopwright.check.Finding.Severity;
import loopwright.design.Amplifier;
import loopwright.design.Hookup;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The signal path as it is painted. */
@ExtendWith(OnEventThread.class)
class PathPaintingTest {
  static Stream<Arguments> paths() {
    Hookup divider = SampleDesigns.divider(0.2);
    return Stream.of(
        Arguments.of("divider", SampleDesigns.npn(), divider),
        Arguments.of("follower", SampleDesigns.npn(), SampleDesigns.follower(2)),
        Arguments.of("inverting", SampleDesigns.npn(), SampleDesigns.inverting(0.1)),
        Arguments.of("open", SampleDesigns.npn(), SampleDesigns.open(1)),
        Arguments.of("from-load", SampleDesigns.npn(), SampleDesigns.followerFromLoad(1)),
        Arguments.of("pnp", SampleDesigns.pnp(), divider),
        Arguments.of("no-follower", SampleDesigns.withoutFollower(), divider),
        Arguments.of("figures", SampleDesigns.figures(), divider));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("paths")
  void everyBlockAndTheWayBackAreDrawn(String name, Amplifier amplifier, Hookup hookup) {
    for (Theme theme : Theme.values()) {
      theme.apply();
      SignalPathPanel panel = panel(amplifier, hookup);
      Painting small = Painting.of(card(panel), 1000, 222).save(file(theme, name, "small"));
      for (Component block : panel.getComponents()) {
        Rectangle inside = block.getBounds();
        inside.grow(-8, -6);
        assertThat(small.countOther(Palette.card(), inside))
            .as(name + ": " + block.getName())
            .isGreaterThan(100);
      }
      int back = small.count(Palette.accent());
      if (name.equals("open")) {
        assertThat(back).isZero();
      } else {
        assertThat(back).isGreaterThan(300);
      }
      Painting large = Painting.of(card(panel), 1900, 370).save(file(theme, name, "large"));
      assertThat(large.count(Palette.wire())).isGreaterThan(small.count(Palette.wire()));
      Painting.of(card(panel), 760, 170).save(file(theme, name, "tiny"));
    }
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void whatIsSelectedStandsOut(Theme theme) {
    theme.apply();
    SignalPathPanel panel = panel(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    JPanel card = card(panel);
    assertThat(Painting.of(card, 1000, 222).count(Palette.accentGround())).isZero();
    panel.select("amplifier.gainStage");
    Painting painting = Painting.of(card, 1000, 222).save(file(theme, "selected", "small"));
    Rectangle stage = bounds(panel, "amplifier.gainStage");
    assertThat(painting.count(Palette.accentGround(), stage)).isGreaterThan(2000);
    assertThat(painting.count(Palette.accentGround()))
        .isEqualTo(painting.count(Palette.accentGround(), stage));
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void whatFailsAndWhatIsRiskyAreMarkedDifferently(Theme theme) {
    theme.apply();
    SignalPathPanel panel = panel(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    panel.mark(
        List.of(
            new Finding(Severity.FAILS, "out.upper", "It melts.", ""),
            new Finding(Severity.RISKY, "amplifier.inputPair", "It is unbalanced.", ""),
            new Finding(Severity.REMARK, "amplifier.gainStage", "It is there.", "")));
    Painting painting = Painting.of(card(panel), 1000, 222).save(file(theme, "marked", "small"));
    assertThat(painting.count(Palette.fails(), bounds(panel, "amplifier.outputStage")))
        .isGreaterThan(50);
    assertThat(painting.count(Palette.risky(), bounds(panel, "amplifier.inputPair")))
        .isBetween(4, 50);
    assertThat(painting.count(Palette.fails()))
        .isEqualTo(painting.count(Palette.fails(), bounds(panel, "amplifier.outputStage")));
  }

  @Test
  void theKeyboardsFocusIsVisible() {
    Theme.LIGHT.apply();
    for (String id :
        List.of("source", "amplifier.inputPair", "feedback", "amplifier.gainStage.load")) {
      SignalPath path =
          PathReader.read(
              SampleDesigns.design(SampleDesigns.npn(), SampleDesigns.divider(0.2)),
              SampleDesigns.divider(0.2),
              Optional.empty());
      Block block = path.find(id).orElseThrow();
      assertThat(accentPixels(block, true)).as(id).isGreaterThan(accentPixels(block, false) + 40);
    }
  }

  private static int accentPixels(Block block, boolean focused) {
    BufferedImage image = new BufferedImage(150, 90, BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    BlockFrame.Look look = new BlockFrame.Look(true, focused, false, Optional.empty());
    new BlockPainter(g2, block, 1, 150, 90, look).paint();
    g2.dispose();
    int count = 0;
    for (int y = 0; y < 90; y++) {
      for (int x = 0; x < 150; x++) {
        count += (image.getRGB(x, y) & 0xFFFFFF) == (Palette.accent().getRGB() & 0xFFFFFF) ? 1 : 0;
      }
    }
    return count;
  }

  private static SignalPathPanel panel(Amplifier amplifier, Hookup hookup) {
    SignalPathPanel panel = new SignalPathPanel();
    panel.show(
        SampleDesigns.design(amplifier, hookup),
        hookup,
        Optional.of(SamplePredictions.stable(hookup)));
    return panel;
  }

  private static JPanel card(SignalPathPanel panel) {
    JPanel card = new JPanel(new BorderLayout());
    card.setBackground(Palette.card());
    card.add(panel);
    return card;
  }

  private static Rectangle bounds(SignalPathPanel panel, String id) {
    return Arrays.stream(panel.getComponents())
        .filter(block -> id.equals(block.getName()))
        .findFirst()
        .orElseThrow()
        .getBounds();
  }

  private static String file(Theme theme, String name, String size) {
    return "path-" + theme + "-" + name + "-" + size;
  }
}
