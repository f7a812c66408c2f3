package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import loopwright.check.Finding;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Every variant drawn: no word is cut, none stands on another, all are where they belong. */
@ExtendWith(OnEventThread.class)
class PathVariantsTest {
  /**
   * What the path has of a window of 1024 by 700 and of one of 1440 by 900 pixels, as {@code
   * WindowPaintingTest} holds the window to.
   */
  private static final int[][] SIZES = {{984, 187}, {1400, 222}};

  private record Word(FittedText.Drawn drawn, Rectangle place) {}

  private static List<Design> designs() {
    return Stream.concat(PathVariants.ofStages().stream(), PathVariants.byFigures().stream())
        .toList();
  }

  @Test
  void everyTwoVariantsMeet() {
    assertThat(Pairwise.rows(List.of(3, 4, 2)))
        .hasSizeGreaterThanOrEqualTo(12)
        .extracting(row -> row[0] * 4 + row[1])
        .contains(0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11);
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void noWordIsCutAndNoneStandsOnAnother(Theme theme) {
    theme.apply();
    List<String> faults = new ArrayList<>();
    int drawn = 0;
    for (int[] size : SIZES) {
      int number = 0;
      for (Design design : designs()) {
        String name = theme + "-" + size[0] + "-" + number++;
        SignalPathPanel panel = panel(design);
        if (number % 12 == 1) {
          Painting.of(panel, size[0], size[1]).save("variant-" + name);
        }
        panel.setSize(size[0], size[1]);
        panel.doLayout();
        List<Word> words = words(panel, design);
        drawn += words.size();
        faults.addAll(faults(words, name));
      }
    }
    assertThat(drawn).isGreaterThan(2 * 30 * 20);
    assertThat(faults).isEmpty();
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void everyBlockIsNamedForWhoCannotSeeIt(Theme theme) {
    theme.apply();
    for (Design design : designs()) {
      for (Component block : panel(design).getComponents()) {
        assertThat(block.getAccessibleContext().getAccessibleName()).isNotBlank();
        assertThat(block.getAccessibleContext().getAccessibleDescription()).isNotBlank();
      }
    }
  }

  /** Words in the coordinates of the panel, each with the area that it has to stay in. */
  private static List<Word> words(SignalPathPanel panel, Design design) {
    Hookup hookup = design.hookups().get(0);
    SignalPath path = PathReader.read(design, hookup, Optional.of(prediction(hookup)));
    PathLayout layout = new PathLayout(path, panel.getWidth(), panel.getHeight());
    BufferedImage image = new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    List<Word> words = new ArrayList<>();
    Rectangle feedback = new Rectangle();
    for (Component component : panel.getComponents()) {
      BlockButton button = (BlockButton) component;
      Rectangle place = button.getBounds();
      if (button.getName().equals(BlockIds.FEEDBACK)) {
        feedback = place;
      }
      BlockFrame.Look look = new BlockFrame.Look(true, false, false, button.worst());
      new BlockPainter(g2, button.block(), layout.scale(), place.width, place.height, look)
          .paint()
          .forEach(drawn -> words.add(new Word(moved(drawn, place), place)));
    }
    Rectangle whole = new Rectangle(0, 0, panel.getWidth(), panel.getHeight());
    new WirePainter(g2, path, layout)
        .paint(feedback)
        .forEach(drawn -> words.add(new Word(drawn, whole)));
    g2.dispose();
    return words;
  }

  private static FittedText.Drawn moved(FittedText.Drawn drawn, Rectangle place) {
    Rectangle bounds = new Rectangle(drawn.bounds());
    bounds.translate(place.x, place.y);
    return new FittedText.Drawn(drawn.wanted(), drawn.text(), bounds);
  }

  private static List<String> faults(List<Word> words, String name) {
    List<String> faults = new ArrayList<>();
    for (int i = 0; i < words.size(); i++) {
      FittedText.Drawn word = words.get(i).drawn();
      if (word.isCut()) {
        faults.add(name + ": cut '" + word.wanted() + "' to '" + word.text() + "'");
      }
      if (!words.get(i).place().contains(word.bounds())) {
        faults.add(name + ": '" + word.text() + "' leaves its place");
      }
      for (int j = 0; j < i; j++) {
        FittedText.Drawn other = words.get(j).drawn();
        if (word.bounds().intersects(other.bounds())) {
          faults.add(name + ": '" + word.text() + "' stands on '" + other.text() + "'");
        }
      }
    }
    return faults;
  }

  private static SignalPathPanel panel(Design design) {
    Hookup hookup = design.hookups().get(0);
    SignalPathPanel panel = new SignalPathPanel();
    panel.show(design, hookup, Optional.of(prediction(hookup)));
    panel.mark(
        Stream.of("pair.q1", "tail.q1", "gain.q1", "gainLoad.q1", "out.upper", "hookups.bench")
            .map(where -> new Finding(Finding.Severity.RISKY, where, "It is risky.", ""))
            .toList());
    return panel;
  }

  /** Every device carries a current, every node stands at a voltage of many digits. */
  private static HookupPrediction prediction(Hookup hookup) {
    HookupPrediction sample = SamplePredictions.stable(hookup);
    Map<String, Double> nodes = new LinkedHashMap<>();
    sample.rest().orElseThrow().nodes().keySet().forEach(node -> nodes.put(node, -11.238));
    Map<String, DeviceState> devices = new LinkedHashMap<>();
    for (String role :
        List.of(
            "pair.q1",
            "pair.q2",
            "tail.q1",
            "tail.q2",
            "gain.q1",
            "gainLoad.q1",
            "gainLoad.q2",
            "out.upper",
            "out.lower")) {
      devices.put(
          role,
          new DeviceState.TransistorState(12.35e-3, 61e-6, 0.65, 8, 0.1, OptionalDouble.empty()));
    }
    return SamplePredictions.atRest(hookup, new RestState(nodes, devices, 0.02, 0.02));
  }
}
