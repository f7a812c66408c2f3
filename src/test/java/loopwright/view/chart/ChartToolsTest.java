package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Container;
import java.awt.event.KeyEvent;
import java.awt.event.MouseEvent;
import java.awt.geom.Point2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import javax.imageio.ImageIO;
import javax.swing.JMenuItem;
import javax.swing.KeyStroke;
import javax.xml.parsers.DocumentBuilderFactory;
import loopwright.predict.ComplexPoint;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Palette;
import loopwright.view.theme.Theme;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.ui.RectangleEdge;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** A plot is read off, zoomed and saved. */
@ExtendWith(OnEventThread.class)
class ChartToolsTest {
  private static final int WIDTH = 640;
  private static final int HEIGHT = 440;

  private final HookupPrediction prediction = SamplePredictions.stable(SampleDesigns.divider(0.2));
  private ChartCanvas canvas;

  @BeforeEach
  void response() {
    Theme.LIGHT.apply();
    canvas = new ChartCanvas();
    Picture picture = new ResponsePlot().picture(prediction, PlotTheme.current());
    canvas.show(picture.chart(), false);
    canvas.titled(picture.title());
    Painting.of(canvas, WIDTH, HEIGHT);
  }

  private void move(int x, int y) {
    MouseEvent event = new MouseEvent(canvas, MouseEvent.MOUSE_MOVED, 0, 0, x, y, 0, false);
    canvas.dispatchEvent(event);
  }

  private Zoom shown() {
    return Zoom.of(canvas.chart().orElseThrow()).orElseThrow();
  }

  private void press(String key) {
    Object name = canvas.getInputMap().get(KeyStroke.getKeyStroke(key));
    assertThat(name).as(key).isNotNull();
    canvas.getActionMap().get(name).actionPerformed(null);
  }

  @Test
  void oneCursorReadsEveryStripAtOnePlace() {
    move(WIDTH / 2, HEIGHT / 3);
    assertThat(canvas.readout()).hasSize(2);
    assertThat(canvas.readout().get(0)).matches("magnitude −?[\\d.]+ dB");
    assertThat(canvas.readout().get(1)).matches("phase −?[\\d.]+°");
    move(WIDTH / 2, HEIGHT - 1);
    assertThat(canvas.readout()).isEmpty();
  }

  @Test
  void theArrowKeysWalkTheCursorAndTheValuesAreThoseOfThePrediction() {
    press("RIGHT");
    List<String> middle = canvas.readout();
    for (int i = 0; i < 400; i++) {
      press("shift LEFT");
    }
    ComplexPoint first = prediction.response().get(0);
    double level = 20 * Math.log10(first.magnitude());
    assertThat(canvas.readout())
        .isNotEqualTo(middle)
        .first()
        .isEqualTo("magnitude " + EngineeringFormat.format(level, Unit.DECIBEL));
    assertThat(canvas.getAccessibleContext().getAccessibleDescription())
        .startsWith("magnitude ")
        .contains("; phase ");
  }

  @Test
  void aDragShowsAPartAndEscGoesBack() {
    Zoom whole = shown();
    canvas.zoomTo(new Point2D.Double(200, 60), new Point2D.Double(400, 62));
    Zoom narrow = shown();
    assertThat(narrow.places().lower()).isGreaterThan(whole.places().lower());
    assertThat(narrow.places().upper()).isLessThan(whole.places().upper());
    assertThat(narrow.values()).isEqualTo(whole.values());
    canvas.zoomTo(new Point2D.Double(200, 60), new Point2D.Double(400, 140));
    assertThat(shown().values().get(0).length()).isLessThan(whole.values().get(0).length());
    assertThat(shown().values().get(1)).isEqualTo(whole.values().get(1));
    press("ESCAPE");
    assertThat(shown()).isEqualTo(narrow);
    press("ESCAPE");
    assertThat(shown()).isEqualTo(whole);
    assertThat(canvas.getActionMap().get("Back").isEnabled())
        .as("Esc is left to the dialog where there is nothing to go back to")
        .isFalse();
  }

  @Test
  void theKeyboardZoomsToo() {
    Zoom whole = shown();
    press("RIGHT");
    canvas
        .getActionMap()
        .get(canvas.getInputMap().get(KeyStroke.getKeyStroke('+')))
        .actionPerformed(null);
    double decades = Math.log10(whole.places().upper() / whole.places().lower());
    assertThat(Math.log10(shown().places().upper() / shown().places().lower()))
        .isCloseTo(decades / 2, within(1e-9));
    press("HOME");
    assertThat(shown()).isEqualTo(whole);
  }

  @Test
  void aZoomedPartStaysWhenTheDesignIsEdited() {
    canvas.zoomTo(new Point2D.Double(200, 60), new Point2D.Double(400, 62));
    Zoom narrow = shown();
    canvas.show(
        new ResponsePlot()
            .picture(SamplePredictions.growing(SampleDesigns.divider(0.2)), PlotTheme.current())
            .chart(),
        false);
    assertThat(shown()).isEqualTo(narrow);
    press("HOME");
    assertThat(shown().places()).isNotEqualTo(narrow.places());
  }

  @Test
  void aNarrowPartOfADecadeStillHasNumbers() {
    canvas.zoomTo(new Point2D.Double(300, 60), new Point2D.Double(312, 62));
    assertThat(
            Drawn.labels(
                DrawnStrip.of(canvas.chart().orElseThrow(), new ChartRenderingInfo())
                    .get(0)
                    .domain(),
                RectangleEdge.BOTTOM,
                500))
        .hasSizeGreaterThan(1)
        .allMatch(label -> label.endsWith("Hz"));
  }

  @Test
  void savedValuesAreThoseOfTheCurvesToTheLastDigit() {
    canvas.zoomTo(new Point2D.Double(200, 60), new Point2D.Double(400, 62));
    List<String> lines = canvas.export().orElseThrow().table().text().lines().toList();
    assertThat(lines.get(0)).isEqualTo("frequency [Hz],magnitude [dB],phase [°]");
    assertThat(lines).hasSize(1 + prediction.response().size());
    for (int i = 0; i < prediction.response().size(); i++) {
      String[] cells = lines.get(i + 1).split(",");
      ComplexPoint point = prediction.response().get(i);
      assertThat(Double.parseDouble(cells[0])).isEqualTo(point.frequency());
      assertThat(Double.parseDouble(cells[1])).isEqualTo(20 * Math.log10(point.magnitude()));
    }
  }

  @Test
  void aSavedSvgIsWellFormedAndItsWordsAreText() throws Exception {
    byte[] svg = canvas.export().orElseThrow().svg();
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
    String words =
        factory
            .newDocumentBuilder()
            .parse(new ByteArrayInputStream(svg))
            .getDocumentElement()
            .getTextContent();
    assertThat(words)
        .contains("Gain 10.9 up to 4 MHz", "magnitude", "phase", "−3 dB at 4 MHz", "1 kHz");
    assertThat(new String(svg, StandardCharsets.UTF_8)).contains("<path");
  }

  @Test
  void aSavedPngIsTheWholePlot() throws Exception {
    BufferedImage image =
        ImageIO.read(new ByteArrayInputStream(canvas.export().orElseThrow().png()));
    assertThat(image.getWidth()).isEqualTo(2 * WIDTH);
    assertThat(image.getHeight()).isEqualTo(2 * HEIGHT);
    int curve = Palette.plot(0).getRGB();
    int count = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      for (int x = 0; x < image.getWidth(); x++) {
        count += image.getRGB(x, y) == curve ? 1 : 0;
      }
    }
    assertThat(count).isGreaterThan(500);
  }

  @Test
  void barsAreSavedWithTheirCauses() {
    canvas.show(new OffsetPlot().picture(prediction, PlotTheme.current()).chart(), false);
    String text = canvas.export().orElseThrow().table().text();
    assertThat(text).startsWith("input offset of the pair").contains("-0.067");
    move(WIDTH / 2, HEIGHT / 2);
    assertThat(canvas.readout()).isEmpty();
  }

  @Test
  void everyItemOfTheMenuHasAMnemonicOfItsOwn() {
    List<Integer> mnemonics =
        Arrays.stream(((Container) canvas.getComponentPopupMenu()).getComponents())
            .filter(JMenuItem.class::isInstance)
            .map(item -> ((JMenuItem) item).getMnemonic())
            .toList();
    assertThat(mnemonics).hasSize(8).doesNotContain(0).doesNotHaveDuplicates();
    assertThat(canvas.getInputMap().get(KeyStroke.getKeyStroke("shift F10"))).isNotNull();
    assertThat(canvas.getInputMap().get(KeyStroke.getKeyStroke(KeyEvent.VK_CONTEXT_MENU, 0)))
        .isNotNull();
  }

  @ParameterizedTest
  @EnumSource(Theme.class)
  void theCursorIsDrawnWithItsValues(Theme theme) {
    theme.apply();
    canvas.show(new ResponsePlot().picture(prediction, PlotTheme.current()).chart(), false);
    canvas.setBackground(Palette.card());
    Painting.of(canvas, WIDTH, HEIGHT);
    int without = Painting.of(canvas, WIDTH, HEIGHT).count(Palette.text());
    move(WIDTH / 3, HEIGHT / 3);
    Painting with = Painting.of(canvas, WIDTH, HEIGHT).save("plot-cursor-" + theme);
    assertThat(with.count(Palette.text())).isGreaterThan(without + HEIGHT / 2);
  }
}
