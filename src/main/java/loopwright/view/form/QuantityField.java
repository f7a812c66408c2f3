package loopwright.view.form;

import java.awt.event.ActionEvent;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.DoubleUnaryOperator;
import javax.swing.AbstractAction;
import javax.swing.JLabel;
import javax.swing.KeyStroke;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import loopwright.view.theme.Theme;

/**
 * A field for a value with a unit. It takes what people write ({@code 8k2}, {@code 33 pF}), and the
 * up and down arrow keys, or the wheel over the field in focus, step a resistance or capacitance
 * through its preferred values.
 */
public final class QuantityField extends CommitField {
  /** How a text was entered. */
  public enum Entry {
    TYPED,
    STEPPED
  }

  private final Unit unit;
  private final JLabel hint = new JLabel();
  private final transient BiFunction<String, Entry, Optional<String>> commit;
  private transient Optional<Quantity> quantity = Optional.empty();

  /**
   * @param unit of the value
   * @param commit takes a text over, as typed or as stepped to; returns why it cannot be, or empty
   */
  public QuantityField(Unit unit, BiFunction<String, Entry, Optional<String>> commit) {
    super(text -> commit.apply(text, Entry.TYPED));
    this.unit = unit;
    this.commit = commit;
    Theme.trailing(this, hint);
    // The field gives what it takes in a style of its own.
    Theme.style(hint, "hint");
    series()
        .ifPresent(
            series -> {
              bind("UP", series::next);
              bind("DOWN", series::previous);
              addMouseWheelListener(
                  event -> {
                    if (isFocusOwner()) {
                      step(event.getWheelRotation() < 0 ? series::next : series::previous);
                    } else {
                      getParent().dispatchEvent(event);
                    }
                  });
            });
  }

  /** Shows a value as its author wrote it, a plain number with prefix and unit; or nothing. */
  public void show(Optional<Quantity> value) {
    quantity = value;
    hint.setText(value.map(this::hint).orElse(unit.symbol()));
    show(value.map(this::text).orElse(""));
  }

  private String text(Quantity value) {
    return value.bare() ? EngineeringFormat.full(value.value(), unit) : value.spelling();
  }

  /** The series in which the value can be bought, or else the unit where the text lacks it. */
  private String hint(Quantity value) {
    if (series().isPresent()) {
      for (PreferredValues series :
          new PreferredValues[] {PreferredValues.E12, PreferredValues.E24, PreferredValues.E96}) {
        if (value.value() > 0 && series.contains(value.value())) {
          return series.name();
        }
      }
    }
    return value.bare() || value.spelling().endsWith(unit.symbol()) ? "" : unit.symbol();
  }

  private Optional<PreferredValues> series() {
    return switch (unit) {
      case OHM -> Optional.of(PreferredValues.E24);
      case FARAD -> Optional.of(PreferredValues.E12);
      default -> Optional.empty();
    };
  }

  private void bind(String key, DoubleUnaryOperator next) {
    getInputMap().put(KeyStroke.getKeyStroke(key), key);
    getActionMap()
        .put(
            key,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                step(next);
              }
            });
  }

  private void step(DoubleUnaryOperator next) {
    commit();
    Optional<Quantity> from = quantity.filter(value -> value.value() > 0).filter(this::isFinite);
    if (from.isPresent() && !isPending()) {
      double value = next.applyAsDouble(from.get().value());
      commit.apply(EngineeringFormat.spelling(value, unit), Entry.STEPPED);
    }
  }

  private boolean isFinite(Quantity value) {
    return Double.isFinite(value.value());
  }
}
