package loopwright.view.form;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.SwingConstants;
import loopwright.predict.DeviceState;
import loopwright.predict.DeviceState.DiodeState;
import loopwright.predict.DeviceState.TransistorState;
import loopwright.predict.RestState;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** The devices of one block at rest, side by side in twos. */
final class RestPanel extends JPanel {
  private static final int ABREAST = 2;

  private final transient Labels labels;

  RestPanel(Labels labels) {
    super(new MigLayout("insets 0, fillx, wrap 3, gapy 3", "[grow,left][75!,right][75!,right]"));
    Theme.style(this, "plain");
    setName("atRest");
    this.labels = labels;
  }

  /** One line: what it is, and how it reads for a device. */
  private record Line(String says, String value) {}

  /** Shows the devices of a block from the newest result, greyed when that is of another edit. */
  void show(Snapshot snapshot, Block block) {
    removeAll();
    if (!block.roles().isEmpty()) {
      fill(snapshot, block);
    }
    revalidate();
    repaint();
  }

  private void fill(Snapshot snapshot, Block block) {
    String age = snapshot.current() ? "" : ", of an earlier edit";
    add(Theme.style(new JLabel("At rest" + age), "caption"), "span 3, gaptop 10");
    Optional<RestState> rest = snapshot.prediction().flatMap(prediction -> prediction.rest());
    if (rest.isEmpty()) {
      String why =
          snapshot.prediction().map(prediction -> prediction.failure()).orElse("not solved yet");
      add(Theme.style(new JLabel("—"), "quiet"), "span 3");
      setToolTipText(why);
      return;
    }
    List<Map.Entry<String, DeviceState>> devices =
        rest.get().devices().entrySet().stream()
            .filter(device -> block.holds(device.getKey()))
            .toList();
    String style = snapshot.current() ? "plain" : "quiet";
    for (int i = 0; i < devices.size(); i += ABREAST) {
      lay(devices.subList(i, Math.min(i + ABREAST, devices.size())), style, i > 0);
    }
  }

  private void lay(List<Map.Entry<String, DeviceState>> devices, String style, boolean apart) {
    add(new JLabel(), apart ? "newline, gaptop 8" : "newline");
    for (Map.Entry<String, DeviceState> device : devices) {
      add(Theme.style(new JLabel(labels.device(device.getKey())), "small"));
    }
    List<List<Line>> columns = devices.stream().map(device -> lines(device.getValue())).toList();
    boolean alike = columns.stream().map(RestPanel::names).distinct().count() == 1;
    if (alike) {
      table(columns, style);
    } else {
      columns.forEach(column -> table(List.of(column), style));
    }
  }

  private void table(List<List<Line>> columns, String style) {
    for (int line = 0; line < columns.get(0).size(); line++) {
      add(Theme.style(new JLabel(columns.get(0).get(line).says()), "quiet"), "newline");
      for (List<Line> column : columns) {
        JLabel value = new JLabel(column.get(line).value(), SwingConstants.RIGHT);
        add(Theme.style(value, style));
      }
    }
  }

  private static List<String> names(List<Line> lines) {
    return lines.stream().map(Line::says).toList();
  }

  private static List<Line> lines(DeviceState device) {
    List<Line> lines = new ArrayList<>();
    if (device instanceof TransistorState transistor) {
      lines.add(line("Collector current", transistor.collectorCurrent(), Unit.AMPERE));
      lines.add(line("Base–emitter", transistor.baseEmitterVoltage(), Unit.VOLT));
      lines.add(line("Collector–emitter", transistor.collectorEmitterVoltage(), Unit.VOLT));
    } else if (device instanceof DiodeState diode) {
      lines.add(line("Current", diode.current(), Unit.AMPERE));
      lines.add(line("Forward voltage", diode.voltage(), Unit.VOLT));
    }
    lines.add(line("Dissipation", device.power(), Unit.WATT));
    OptionalDouble junction = device.junctionTemperature();
    lines.add(
        junction.isPresent()
            ? line("Junction", junction.getAsDouble(), Unit.CELSIUS)
            : new Line("Junction", "not known"));
    return lines;
  }

  private static Line line(String says, double value, Unit unit) {
    return new Line(says, EngineeringFormat.format(value, unit));
  }
}
