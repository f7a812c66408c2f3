package loopwright.view.frame;

import static loopwright.view.frame.WindowHand.onEventThread;
import static loopwright.view.frame.WindowHand.waitFor;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.Component;
import java.awt.Container;
import java.awt.EventQueue;
import java.awt.GraphicsEnvironment;
import java.awt.Point;
import java.awt.Rectangle;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;
import javax.swing.JFrame;
import javax.swing.JTabbedPane;
import javax.swing.JTable;
import javax.swing.JTextField;
import javax.swing.text.JTextComponent;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.part.Shelf;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.session.Session;
import loopwright.task.BackgroundRunner;
import loopwright.view.Lookup;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The window on a real display, driven by keys and pointer, with the real solver behind it. */
class MainWindowTest {
  private static final String CAPACITOR = "amplifier.gainStage.compensation.capacitance";

  @TempDir private Path folder;
  private Path file;
  private Session session;
  private JFrame frame;
  private WindowHand hand;
  private DesignFile files;

  @BeforeEach
  void open() throws Exception {
    assumeFalse(GraphicsEnvironment.isHeadless(), "needs a display");
    file = folder.resolve("hydrophone.json");
    Files.copy(Path.of("examples/hydrophone-follower.json"), file);
    hand = new WindowHand();
    frame =
        onEventThread(
            () -> {
              Shelf shelf = new ShelfFile().shipped();
              files =
                  new DesignFile(
                      shelf,
                      Catalogue.figures().stream()
                          .collect(Collectors.toMap(Figure::key, Figure::unit)));
              session =
                  new Session(
                      files,
                      Screenshots.SOURCE,
                      new BackgroundRunner(EventQueue::invokeLater),
                      file);
              MainWindow window =
                  new MainWindow(
                      session,
                      shelf,
                      Theme.LIGHT,
                      SampleKeeping.in(folder.resolve("user"), session, files),
                      new SilentDialogs());
              window.open();
              return window.frame();
            });
    waitFor(() -> cell("oscillationFrequency", FiguresModel.SOLVED).contains("MHz"));
  }

  @AfterEach
  void close() throws Exception {
    if (frame != null) {
      onEventThread(
          () -> {
            session.close();
            frame.dispose();
            return null;
          });
    }
  }

  @Test
  void anEditChangesFiguresAndPlotsAndUndoTakesItBack() throws Exception {
    String before = cell("worstPhaseMargin", FiguresModel.SOLVED);
    onEventThread(() -> select("Over swing"));
    String title = plotTitle();
    assertThat(title).containsIgnoringCase("grows");

    hand.type(field(CAPACITOR), "220p");
    hand.press(KeyEvent.VK_ENTER, 0);
    waitFor(() -> cell("oscillationFrequency", FiguresModel.SOLVED).equals("—"));
    assertThat(cell("worstPhaseMargin", FiguresModel.SOLVED)).isNotEqualTo(before);
    waitFor(() -> !plotTitle().equals(title));
    assertThat(onEventThread(frame::getTitle)).startsWith("*");

    hand.press(KeyEvent.VK_Z, InputEvent.CTRL_DOWN_MASK);
    waitFor(() -> cell("worstPhaseMargin", FiguresModel.SOLVED).equals(before));
    assertThat(onEventThread(frame::getTitle)).doesNotStartWith("*");
  }

  @Test
  void aMeasuredGainBecomesAReadingAndIsSaved() throws Exception {
    typeMeasured("closedLoopGain", "0.998");
    waitFor(() -> cell("closedLoopGain", FiguresModel.MEASURED).startsWith("0.998"));
    Design design = onEventThread(() -> session.snapshot().design());
    assertThat(design.bench().readings())
        .extracting(Reading::quantity)
        .containsExactly("closedLoopGain");

    hand.press(KeyEvent.VK_S, InputEvent.CTRL_DOWN_MASK);
    waitFor(() -> !onEventThread(() -> session.snapshot().unsaved()));
    assertThat(files.read(file).design().bench().readings().get(0).value().value())
        .isEqualTo(0.998);
  }

  @Test
  void aWrongUnitIsSaidInPlaceAndChangesNothing() throws Exception {
    Design before = onEventThread(() -> session.snapshot().design());
    hand.type(field(CAPACITOR), "10 kHz");
    hand.press(KeyEvent.VK_ENTER, 0);
    waitFor(
        () ->
            onEventThread(
                () ->
                    Lookup.find(frame.getContentPane(), CAPACITOR + ".complaint")
                        .filter(Component::isVisible)
                        .isPresent()));
    assertThat(onEventThread(() -> session.snapshot().design())).isEqualTo(before);
  }

  private Object select(String tab) {
    JTabbedPane tabs = Lookup.all(frame.getContentPane(), JTabbedPane.class).get(0);
    tabs.setSelectedIndex(tabs.indexOfTab(tab));
    return null;
  }

  private String plotTitle() throws Exception {
    return onEventThread(
        () -> {
          JTabbedPane tabs = Lookup.all(frame.getContentPane(), JTabbedPane.class).get(0);
          Container pane = (Container) tabs.getSelectedComponent();
          return Lookup.named(pane, "title", JTextComponent.class).getText();
        });
  }

  private JTextField field(String path) throws Exception {
    return onEventThread(
        () ->
            Lookup.all(frame.getContentPane(), JTextField.class).stream()
                .filter(candidate -> path.equals(candidate.getName()))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no field " + path)));
  }

  private JTable table() {
    return Lookup.named(frame.getContentPane(), "figures", JTable.class);
  }

  private String cell(String figure, int column) throws Exception {
    return onEventThread(() -> String.valueOf(table().getValueAt(row(figure), column)));
  }

  private int row(String figure) {
    FiguresModel model = (FiguresModel) table().getModel();
    for (int row = 0; row < model.getRowCount(); row++) {
      if (model.figure(row).key().equals(figure)) {
        return row;
      }
    }
    throw new AssertionError("no row " + figure);
  }

  private void typeMeasured(String figure, String text) throws Exception {
    Point at =
        onEventThread(
            () -> {
              Rectangle cell = table().getCellRect(row(figure), FiguresModel.MEASURED, true);
              Point corner = table().getLocationOnScreen();
              return new Point(
                  corner.x + (int) cell.getCenterX(), corner.y + (int) cell.getCenterY());
            });
    hand.click(at);
    hand.click(at);
    hand.keys(text);
    hand.press(KeyEvent.VK_ENTER, 0);
  }
}
