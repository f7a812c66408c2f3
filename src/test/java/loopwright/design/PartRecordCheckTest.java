package loopwright.design;

import static loopwright.design.SampleDesigns.full;
import static loopwright.design.SampleDesigns.quantity;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeRecord;
import loopwright.part.Pin;
import loopwright.part.Polarity;
import loopwright.part.TransistorRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class PartRecordCheckTest {
  static List<Arguments> broken() {
    return List.of(
        broken(
            "N.model",
            null,
            "N",
            "found neither model nor datasheet, expected at least one of the two"),
        broken(
            "D.model",
            null,
            "D",
            "found neither model nor datasheet, expected at least one of the two"),
        broken(
            "N.model.saturationCurrent",
            null,
            "N.model.saturationCurrent",
            "found nothing, expected a saturation current, or a datasheet"),
        broken(
            "N.model.forwardBeta",
            null,
            "N.model.forwardBeta",
            "found nothing, expected a forward beta, or a datasheet"),
        broken(
            "D.model.saturationCurrent",
            null,
            "D.model.saturationCurrent",
            "found nothing, expected a saturation current, or a datasheet"),
        broken(
            "ND.datasheet.beta",
            List.of(),
            "ND.datasheet.beta",
            "found nothing, expected one beta at a current"),
        broken(
            "ND.datasheet.baseEmitterVoltage",
            List.of(),
            "ND.datasheet.baseEmitterVoltage",
            "found nothing, expected one base-emitter voltage at a current"),
        broken(
            "DD.datasheet.forwardVoltage",
            List.of(),
            "DD.datasheet.forwardVoltage",
            "found nothing, expected one forward voltage at a current"),
        broken(
            "DD.datasheet.forwardVoltage",
            List.of(
                new DiodeDatasheet.ForwardVoltage(
                    quantity("10m"), Optional.empty(), Optional.empty())),
            "DD.datasheet.forwardVoltage.0",
            "found no figure, expected a minimum, typical or maximum value"),
        broken(
            "ND.datasheet.beta.0.minimum",
            quantity("300"),
            "ND.datasheet.beta.0",
            "found 300 before 290, expected minimum, typical and maximum in rising order"),
        broken(
            "ND.datasheet.baseEmitterVoltage.0.maximum",
            quantity("0.6"),
            "ND.datasheet.baseEmitterVoltage.0",
            "found 0.66 before 0.6, expected minimum, typical and maximum in rising order"),
        broken(
            "ND.datasheet.transitionFrequency.typical",
            quantity("100 MHz"),
            "ND.datasheet.transitionFrequency",
            "found 150 MHz before 100 MHz, expected minimum, typical and maximum in rising order"),
        broken(
            "ND.datasheet.outputCapacitance.maximum",
            quantity("1p"),
            "ND.datasheet.outputCapacitance",
            "found 4.5p before 1p, expected minimum, typical and maximum in rising order"),
        broken(
            "ND.datasheet.inputCapacitance.maximum",
            quantity("1p"),
            "ND.datasheet.inputCapacitance",
            "found 9p before 1p, expected minimum, typical and maximum in rising order"),
        broken(
            "ND.datasheet.outputConductance.maximum",
            quantity("0.5u"),
            "ND.datasheet.outputConductance",
            "found 1u before 0.5u, expected minimum, typical and maximum in rising order"),
        broken(
            "N.pins",
            List.of(Pin.EMITTER, Pin.BASE),
            "N.pins",
            "found emitter, base, expected each of emitter, base, collector once"),
        broken(
            "N.pins",
            List.of(Pin.EMITTER, Pin.BASE, Pin.BASE),
            "N.pins",
            "found emitter, base, base, expected each of emitter, base, collector once"),
        broken(
            "DD.pins",
            List.of(Pin.BASE, Pin.CATHODE),
            "DD.pins",
            "found base, cathode, expected each of anode, cathode once"));
  }

  private static Arguments broken(String path, Object value, String where, String says) {
    return Arguments.of(
        DesignPath.set(full(), "parts." + path, value), new Problem("parts." + where, says));
  }

  @ParameterizedTest
  @MethodSource("broken")
  void namesPlaceFoundAndExpected(Design design, Problem expected) {
    assertThat(DesignValidation.check(design)).containsExactly(expected);
  }

  @Test
  void letsTheModelFillWhatTheDatasheetLacks() {
    TransistorRecord datasheet = SampleDesigns.datasheetTransistor(Polarity.NPN);
    TransistorRecord both =
        new TransistorRecord(
            Polarity.NPN,
            SampleDesigns.transistor(Polarity.NPN).model(),
            datasheet.datasheet(),
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            List.of());
    Design design = DesignPath.set(full(), "parts.ND", both);
    design = DesignPath.set(design, "parts.ND.datasheet.beta", List.of());
    design = DesignPath.set(design, "parts.ND.datasheet.baseEmitterVoltage", List.of());
    assertThat(DesignValidation.check(design)).isEmpty();

    DiodeRecord diode =
        new DiodeRecord(
            SampleDesigns.diode().model(),
            SampleDesigns.datasheetDiode().datasheet(),
            Optional.empty(),
            Optional.empty(),
            List.of());
    design = DesignPath.set(full(), "parts.DD", diode);
    design = DesignPath.set(design, "parts.DD.datasheet.forwardVoltage", List.of());
    assertThat(DesignValidation.check(design)).isEmpty();
  }

  @Test
  void refusesAPartWithoutAName() {
    Design design = DesignPath.set(full(), "parts. ", SampleDesigns.diode());
    assertThat(DesignValidation.check(design))
        .containsExactly(
            new Problem(
                "parts", "found a part without a name, expected a name such as the type number"));
  }
}
