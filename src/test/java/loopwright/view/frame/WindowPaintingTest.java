package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import java.util.stream.Collectors;
import javax.swing.JLabel;
import javax.swing.JTabbedPane;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.session.Session;
import loopwright.task.SameThreadRunner;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.path.SignalPathPanel;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every view is painted without a display, in both themes, large and small. */
@ExtendWith(OnEventThread.class)
class WindowPaintingTest {
  @ParameterizedTest
  @CsvSource({
    "LIGHT, 1440, 900, seismometer-coil",
    "DARK, 1440, 900, hydrophone-follower",
    "LIGHT, 1024, 700, measured-amplifier",
    "DARK, 1024, 700, nine-volt-preamplifier"
  })
  void everyViewIsPainted(Theme theme, int width, int height, String example) {
    theme.apply();
    Shelf shelf = new ShelfFile().shipped();
    DesignFile files =
        new DesignFile(
            shelf,
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)));
    Session session =
        new Session(
            files,
            Screenshots.SOURCE,
            new SameThreadRunner(),
            Path.of("examples", example + ".json"));
    WindowPicture picture = new WindowPicture(session, shelf, theme, width, height);
    JTabbedPane plots = Lookup.all(picture.root(), JTabbedPane.class).get(0);
    Set<Integer> pictures = new HashSet<>();
    for (int tab = 0; tab < plots.getTabCount(); tab++) {
      plots.setSelectedIndex(tab);
      picture.layOut();
      BufferedImage image = picture.paint(1);
      assertThat(colours(image)).as("colours of tab %d", tab).isGreaterThan(40);
      pictures.add(Arrays.hashCode(image.getRGB(0, 0, width, height, null, 0, width)));
    }
    assertThat(pictures).hasSize(plots.getTabCount());
    assertThat(Lookup.named(picture.root(), "name", JLabel.class).getText())
        .isEqualTo(session.snapshot().design().name());
    assertThat(Lookup.named(picture.root(), "status", JLabel.class).getText())
        .contains("every figure is of this edit");
    picture.close();
  }

  /** {@code PathVariantsTest} draws every variant at these sizes. */
  @ParameterizedTest
  @CsvSource({
    "LIGHT, 1024, 700, 984, 187",
    "DARK, 1024, 700, 984, 187",
    "LIGHT, 1440, 900, 1400, 222",
    "DARK, 1440, 900, 1400, 222"
  })
  void theSignalPathHasRoomForEveryVariant(
      Theme theme, int width, int height, int pathWidth, int pathHeight) {
    theme.apply();
    WindowPicture picture =
        new WindowPicture(SampleSessions.quick(), Shelf.empty(), theme, width, height);
    SignalPathPanel path = Lookup.all(picture.root(), SignalPathPanel.class).get(0);
    assertThat(path.getWidth()).isGreaterThanOrEqualTo(pathWidth);
    assertThat(path.getHeight()).isGreaterThanOrEqualTo(pathHeight);
    picture.close();
  }

  private static int colours(BufferedImage image) {
    Set<Integer> colours = new HashSet<>();
    for (int y = 0; y < image.getHeight(); y += 2) {
      for (int x = 0; x < image.getWidth(); x += 2) {
        colours.add(image.getRGB(x, y));
      }
    }
    return colours.size();
  }
}
