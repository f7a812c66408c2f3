package loopwright.view.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import loopwright.bench.ReadingUnit;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.NamedPart;
import loopwright.design.Reading;
import loopwright.quantity.Quantity;
import loopwright.quantity.QuantityException;
import loopwright.quantity.Unit;
import loopwright.session.Snapshot;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** Takes a new reading: what, where, how much, by which instrument. */
final class ReadingEntry extends JPanel {
  private static final String NONE = "none";
  private static final List<String> EXPRESSIONS =
      List.of("as shown", "peak", "peak to peak", "rms");

  private final transient Supplier<Snapshot> now;
  private final transient Consumer<Reading> onAdd;
  private final JComboBox<Named> quantity = new JComboBox<>();
  private final JComboBox<String> place = new JComboBox<>();
  private final JTextField value = new JTextField();
  private final JComboBox<String> expression = new JComboBox<>(EXPRESSIONS.toArray(String[]::new));
  private final JComboBox<String> instrument = new JComboBox<>();
  private final JLabel complaint = Theme.style(new JLabel(" "), "failing");

  /** A quantity by its words. */
  private record Named(String key) {
    @Override
    public String toString() {
      return ReadingWords.quantity(key);
    }
  }

  ReadingEntry(Supplier<Snapshot> now, Consumer<Reading> onAdd) {
    super(new MigLayout("insets 0, fillx, wrap 1", "[grow,fill]", "[]4[]2[]"));
    Theme.style(this, "plain");
    this.now = now;
    this.onAdd = onAdd;
    ReadingUnit.quantities().forEach(key -> quantity.addItem(new Named(key)));
    quantity.setName("quantity");
    quantity.setMaximumRowCount(24);
    quantity.addActionListener(event -> fillPlaces(now.get()));
    place.setName("place");
    place.setMaximumRowCount(24);
    value.setName("value");
    value.addActionListener(event -> add());
    expression.setName("expression");
    instrument.setName("instrument");
    complaint.setName("complaint");
    JButton add = Theme.style(new JButton("Add reading"), "pill");
    add.setName("add");
    add.setMnemonic('D');
    add.addActionListener(event -> add());
    add(new Inputs().field("Quantity", 'Q', quantity, 190).field("at", 'T', place, 300));
    add(
        new Inputs()
            .field("Value", 'V', value, 90)
            .field("shown as", 'H', expression, 110)
            .field("by", 'Y', instrument, 130)
            .own(add));
    add(complaint, "wmin 0");
    fillPlaces(now.get());
  }

  /** Offers the places and instruments of this moment. */
  void show(Snapshot snapshot) {
    fillPlaces(snapshot);
    List<String> wanted = new ArrayList<>();
    wanted.add(NONE);
    wanted.addAll(snapshot.design().bench().instruments().keySet());
    fill(instrument, wanted);
  }

  private String key() {
    return ((Named) quantity.getSelectedItem()).key();
  }

  private void fillPlaces(Snapshot snapshot) {
    fill(place, places(snapshot));
    place.setEnabled(place.getItemCount() > 0);
  }

  private List<String> places(Snapshot snapshot) {
    return switch (key()) {
      case "nodeVoltage" ->
          snapshot
              .prediction()
              .flatMap(prediction -> prediction.rest())
              .map(rest -> List.copyOf(rest.nodes().keySet()))
              .orElse(List.of("out"));
      case "collectorCurrent", "baseEmitterVoltage", "temperature", "beta" ->
          DeviceRoles.of(snapshot.design()).stream().map(DeviceRole::role).toList();
      case "supplyCurrent" -> List.of("positive", "negative");
      case "resistance" -> parts(snapshot, Unit.OHM);
      case "capacitance" -> parts(snapshot, Unit.FARAD);
      default -> List.of();
    };
  }

  private static List<String> parts(Snapshot snapshot, Unit unit) {
    return DesignPath.parts(snapshot.design()).stream()
        .filter(part -> part.unit() == unit)
        .map(NamedPart::path)
        .toList();
  }

  private static void fill(JComboBox<String> box, List<String> wanted) {
    Object chosen = box.getSelectedItem();
    box.removeAllItems();
    wanted.forEach(box::addItem);
    if (chosen != null && wanted.contains(chosen)) {
      box.setSelectedItem(chosen);
    }
  }

  private void add() {
    try {
      Unit unit = ReadingUnit.of(reading(Quantity.of(0)));
      Quantity read = Quantity.parse(value.getText().strip(), unit);
      if (!Double.isFinite(read.value())) {
        throw new QuantityException(
            "found \"" + value.getText() + "\", expected what an instrument can show");
      }
      complaint.setText(" ");
      Theme.markWrong(value, false);
      onAdd.accept(reading(read));
      value.setText("");
    } catch (QuantityException e) {
      complaint.setText(ReadingWords.quantity(key()) + ": " + e.getMessage());
      Theme.markWrong(value, true);
    }
  }

  private Reading reading(Quantity read) {
    String key = key();
    Optional<String> where = Optional.ofNullable((String) place.getSelectedItem());
    boolean loose = List.of("resistance", "capacitance", "beta").contains(key);
    boolean ofDevice =
        List.of("collectorCurrent", "baseEmitterVoltage", "temperature").contains(key);
    return new Reading(
        loose ? Optional.empty() : Optional.of(now.get().hookup()),
        key,
        read,
        where.filter(chosen -> key.equals("nodeVoltage")),
        where.filter(chosen -> ofDevice),
        where.filter(chosen -> loose),
        where
            .filter(chosen -> key.equals("supplyCurrent"))
            .map(
                chosen ->
                    chosen.equals("positive") ? Reading.Rail.POSITIVE : Reading.Rail.NEGATIVE),
        Optional.empty(),
        Optional.empty(),
        Optional.ofNullable((String) instrument.getSelectedItem())
            .filter(name -> !name.equals(NONE)),
        Optional.empty(),
        expressed(),
        Optional.empty(),
        Optional.empty());
  }

  private Optional<Reading.Expression> expressed() {
    return switch (EXPRESSIONS.indexOf(expression.getSelectedItem())) {
      case 1 -> Optional.of(Reading.Expression.PEAK);
      case 2 -> Optional.of(Reading.Expression.PEAK_TO_PEAK);
      case 3 -> Optional.of(Reading.Expression.RMS);
      default -> Optional.empty();
    };
  }
}
