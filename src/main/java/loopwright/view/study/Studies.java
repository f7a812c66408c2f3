package loopwright.view.study;

import java.awt.Dialog;
import java.awt.Dimension;
import java.awt.Window;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.KeyStroke;
import javax.swing.WindowConstants;
import loopwright.design.Design;
import loopwright.part.Shelf;
import loopwright.session.Snapshot;

/** Opens the studies, each in a dialog beside the window that stays until it is closed. */
public final class Studies {
  private static final Dimension USUAL = new Dimension(980, 560);
  private static final Dimension LEAST = new Dimension(760, 420);

  private final Window owner;
  private final Desk desk;
  private final Shelf shelf;
  private final Map<String, JDialog> open = new LinkedHashMap<>();
  private final Map<String, Study> studies = new LinkedHashMap<>();

  /**
   * @param owner the window that they stand beside
   * @param desk its session
   * @param shelf parts to choose from beside those of the design
   */
  public Studies(Window owner, Desk desk, Shelf shelf) {
    this.owner = owner;
    this.shelf = shelf;
    this.desk = desk;
  }

  /** Ranked dividers for a wanted gain. */
  public void divider() {
    show("divider", DividerStudy::new);
  }

  /**
   * A first design from a specification.
   *
   * @param onOpen takes the design in place of the present one
   */
  public void first(Consumer<Design> onOpen) {
    show("first", self -> new FirstDesignStudy(self, shelf, onOpen));
  }

  /** Which resistor trims offset and gain. */
  public void trim() {
    show("trim", TrimStudy::new);
  }

  /** Cures of an oscillation. */
  public void cure() {
    show("cure", CureStudy::new);
  }

  /** Stability against one value after the other. */
  public void stability() {
    show("stability", StabilityStudy::new);
  }

  /** Steps and oscillation in time. */
  public void time() {
    show("time", TimeStudy::new);
  }

  /** Distortion in a steady state. */
  public void distortion() {
    show("distortion", DistortionStudy::new);
  }

  /** Noise and impedances against frequency. */
  public void spectra() {
    show("spectra", SpectrumStudy::new);
  }

  /** Idle current, runaway and dissipation. */
  public void heat() {
    show("heat", HeatStudy::new);
  }

  /** The schematic. */
  public void schematic() {
    show("schematic", SchematicStudy::new);
  }

  /** Bands for the tolerances. */
  public void spread() {
    show("spread", SpreadStudy::new);
  }

  /** Readings beside the prediction. */
  public void bench() {
    show("bench", BenchStudy::new);
  }

  /** The sheet for the bench. */
  public void sheet() {
    show("sheet", SheetStudy::new);
  }

  /** Every field of the design. */
  public void whole() {
    show("whole", self -> new WholeStudy(self, shelf));
  }

  /** Tells all that are open of another moment. */
  public void tell(Snapshot snapshot) {
    studies.values().forEach(study -> study.show(snapshot));
  }

  /** Closes all. */
  public void close() {
    open.values().forEach(JDialog::dispose);
  }

  private void show(String key, Function<Desk, Study> make) {
    JDialog dialog =
        open.computeIfAbsent(
            key,
            absent -> {
              Study study = make.apply(desk);
              studies.put(key, study);
              return dialog(study);
            });
    dialog.setVisible(true);
    dialog.toFront();
  }

  private JDialog dialog(Study study) {
    JDialog dialog = new JDialog(owner, study.title(), Dialog.ModalityType.MODELESS);
    dialog.setName(study.getName());
    dialog.setContentPane(study);
    dialog.getRootPane().setDefaultButton(study.defaultButton());
    dialog
        .getRootPane()
        .registerKeyboardAction(
            event -> dialog.setVisible(false),
            KeyStroke.getKeyStroke("ESCAPE"),
            JComponent.WHEN_IN_FOCUSED_WINDOW);
    dialog.setDefaultCloseOperation(WindowConstants.HIDE_ON_CLOSE);
    dialog.setMinimumSize(LEAST);
    dialog.setSize(USUAL);
    dialog.setLocationRelativeTo(owner);
    return dialog;
  }
}
