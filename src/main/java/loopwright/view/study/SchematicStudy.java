package loopwright.view.study;

import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JCheckBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import loopwright.assembly.AssemblyException;
import loopwright.design.Design;
import loopwright.design.DesignException;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRoles;
import loopwright.design.PartValue;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupPrediction;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.sheet.SchematicDrawing;
import loopwright.sheet.SchematicOverlay;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** The schematic of the chosen hookup, with voltages and currents laid over it. */
public final class SchematicStudy extends Study {
  private final transient Desk desk;
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final JCheckBox overlay = new JCheckBox("Voltages and currents", true);
  private final JButton next = Theme.style(new JButton("Next part"), "pill");
  private final SchematicView view;

  /**
   * @param desk the window's session
   */
  public SchematicStudy(Desk desk) {
    super("Schematic");
    this.desk = desk;
    view = new SchematicView(this::says, part -> where.setText(says(part)));
    where.setName("where");
    overlay.setName("overlay");
    overlay.setMnemonic('V');
    overlay.setOpaque(false);
    overlay.addActionListener(event -> show(desk.now().get()));
    next.setName("next");
    next.setMnemonic('N');
    next.addActionListener(event -> view.step(1));
    JPanel bar = Theme.style(new JPanel(new MigLayout("insets 0")), "plain");
    bar.add(overlay);
    bar.add(next);
    add(where);
    add(bar);
    add(view, "grow, hmin 240");
    show(desk.now().get());
  }

  @Override
  public void show(Snapshot snapshot) {
    try {
      view.show(
          Optional.of(SchematicDrawing.of(snapshot.design(), snapshot.hookup())),
          overlay.isSelected()
              ? prediction(snapshot).flatMap(SchematicOverlay::of)
              : Optional.empty());
      where.setText("hookup " + snapshot.hookup() + "; arrow keys walk from part to part");
    } catch (AssemblyException impossible) {
      view.show(Optional.empty(), Optional.empty());
      where.setText("No schematic: " + impossible.getMessage());
    }
  }

  /** The prediction of the present edit, where there is one already. */
  private static Optional<HookupPrediction> prediction(Snapshot snapshot) {
    return snapshot.current() ? snapshot.prediction() : Optional.empty();
  }

  /** A part with its value and what it carries at rest. */
  private String says(String part) {
    Snapshot now = desk.now().get();
    Design design = now.design();
    Optional<DeviceState> device =
        prediction(now)
            .flatMap(HookupPrediction::rest)
            .map(RestState::devices)
            .map(all -> all.get(part));
    if (device.isPresent()) {
      String type = DeviceRoles.find(design, part).map(found -> found.part()).orElse("");
      return part + ": " + type + ", " + state(device.get());
    }
    String path = part.split("@")[0];
    try {
      return DesignPath.find(design, path)
          .filter(PartValue.class::isInstance)
          .map(value -> path + ": " + value(design, path, (PartValue) value))
          .orElse(part);
    } catch (DesignException notAPlace) {
      return part;
    }
  }

  private static String value(Design design, String path, PartValue value) {
    Unit unit = DesignPath.field(design, path).unit().orElse(Unit.ONE);
    return EngineeringFormat.format(value.effective(), unit)
        + value.tolerance().map(t -> " \u00B1" + EngineeringFormat.percent(t.value())).orElse("");
  }

  private static String state(DeviceState device) {
    String power = EngineeringFormat.format(device.power(), Unit.WATT, 3);
    if (device instanceof DeviceState.TransistorState state) {
      return EngineeringFormat.format(state.collectorCurrent(), Unit.AMPERE, 3)
          + " at "
          + EngineeringFormat.format(state.collectorEmitterVoltage(), Unit.VOLT, 3)
          + ", "
          + power;
    }
    return EngineeringFormat.format(((DeviceState.DiodeState) device).current(), Unit.AMPERE, 3)
        + ", "
        + power;
  }

  @Override
  public JButton defaultButton() {
    return next;
  }
}
