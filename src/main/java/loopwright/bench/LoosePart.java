package loopwright.bench;

import java.util.Optional;
import loopwright.characterise.FitException;
import loopwright.characterise.TransistorFit;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.design.Reading;
import loopwright.part.TransistorRecord;
import loopwright.predict.DeviceState;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;

/**
 * A part that was measured out of its circuit.
 *
 * @param name path of a resistor or capacitor, role of a device, or name of a part record
 * @param nominal what the design says of it
 */
record LoosePart(String name, FigureValue nominal) {
  static LoosePart of(Design design, HookupFigures figures, Reading reading) {
    String name = reading.part().orElse("");
    if (reading.quantity().equals("beta")) {
      return new LoosePart(name, beta(design, figures, name));
    }
    return new LoosePart(
        name,
        DesignPath.parts(design).stream()
            .filter(part -> part.path().equals(name))
            .findFirst()
            .map(part -> FigureValue.of(printed(part.value())))
            .orElseGet(() -> FigureValue.none("no part of the design has the path " + name)));
  }

  /** How it moves when a part that spreads moves by its standard uncertainty. */
  double move(TolerancedPart part) {
    boolean same =
        switch (part.kind()) {
          case RESISTOR, CAPACITOR ->
              part.name().equals(name) || part.name().startsWith(name + "@");
          case BETA -> part.name().equals(name);
          default -> false;
        };
    return same && nominal.number().isPresent()
        ? nominal.number().getAsDouble() * part.standardUncertainty()
        : 0;
  }

  private static double printed(PartValue value) {
    return value.value().value();
  }

  private static FigureValue beta(Design design, HookupFigures figures, String name) {
    if (figures.devices().get(name) instanceof DeviceState.TransistorState state) {
      return FigureValue.of(state.collectorCurrent() / state.baseCurrent());
    }
    if (design.parts().get(name) instanceof TransistorRecord record) {
      try {
        return FigureValue.of(
            TransistorFit.fit(record, Optional.empty()).parameters().forwardBeta());
      } catch (FitException e) {
        return FigureValue.none(e.getMessage());
      }
    }
    return FigureValue.none("no transistor is called " + name);
  }
}
