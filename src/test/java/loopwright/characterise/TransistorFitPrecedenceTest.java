package loopwright.characterise;

import static loopwright.characterise.Records.beta;
import static loopwright.characterise.Records.capacitance;
import static loopwright.characterise.Records.datasheet;
import static loopwright.characterise.Records.measuredBeta;
import static loopwright.characterise.Records.measuredVoltage;
import static loopwright.characterise.Records.model;
import static loopwright.characterise.Records.none;
import static loopwright.characterise.Records.of;
import static loopwright.characterise.Records.transistor;
import static loopwright.characterise.Records.voltage;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorModel;
import loopwright.part.TransistorParameters;
import loopwright.part.TransistorRecord;
import loopwright.quantity.Quantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Which of model, datasheet and tester has the word, what is noted and what is refused. */
class TransistorFitPrecedenceTest {
  private static final double NOTHING = Double.NaN;

  private static final TransistorDatasheet CURVED =
      datasheet(List.of(beta(1e-5, 150), beta(2e-3, 290), beta(0.1, 180)), voltage(2e-3, 0.66));

  private static FittedTransistor fit(
      TransistorModel model, TransistorDatasheet sheet, TransistorMeasured measured) {
    return TransistorFit.fit(
        transistor(
            Optional.ofNullable(model), Optional.ofNullable(sheet), Optional.ofNullable(measured)),
        Optional.empty());
  }

  @Test
  void whatTheModelStatesHoldsAndTheRestIsSolvedBesideIt() {
    FittedTransistor fitted = fit(model(2e-14, NOTHING, 3e-13), CURVED, null);

    TransistorParameters found = fitted.parameters();
    assertThat(found.saturationCurrent()).isEqualTo(2e-14);
    assertThat(found.recombinationCurrent()).isEqualTo(3e-13);
    assertThat(found.forwardBeta()).isBetween(100.0, 1000.0);
    assertThat(found.kneeCurrent()).isFinite();
    assertThat(fitted.comparison())
        .extracting(FigureComparison::use)
        .containsExactly(
            FigureUse.COMPARED,
            FigureUse.LEAST_SQUARES,
            FigureUse.LEAST_SQUARES,
            FigureUse.LEAST_SQUARES);
  }

  @Test
  void aModelAloneIsTakenAsItStands() {
    FittedTransistor fitted = fit(model(2e-14, 180, NOTHING), null, null);

    assertThat(fitted.parameters())
        .isEqualTo(TransistorParameters.DEFAULTS.withSaturationCurrent(2e-14).withForwardBeta(180));
    assertThat(fitted.comparison()).isEmpty();
  }

  @Test
  void aMeasuredBetaMovesTheForwardBetaAlone() {
    TransistorParameters type = fit(null, CURVED, null).parameters();
    FittedTransistor fitted = fit(null, CURVED, measuredBeta(1e-3, 350));

    TransistorParameters part = fitted.parameters();
    assertThat(new TransistorFigures(part).beta(1e-3, 5)).isCloseTo(350, within(1e-7));
    assertThat(part.withForwardBeta(type.forwardBeta())).isEqualTo(type);
    assertThat(fitted.comparison().get(0).figure()).isEqualTo("beta, measured");
    assertThat(fitted.comparison().get(0).use()).isEqualTo(FigureUse.SOLVED);
    assertThat(fitted.notes()).isEmpty();
  }

  @Test
  void aMeasuredVoltageMovesTheSaturationCurrentAlone() {
    TransistorParameters type = fit(null, CURVED, null).parameters();
    TransistorParameters part = fit(null, CURVED, measuredVoltage(1e-3, 0.63, 25)).parameters();

    assertThat(new TransistorFigures(part).baseEmitterVoltage(1e-3, 5))
        .isCloseTo(0.63, within(1e-12));
    assertThat(part.withSaturationCurrent(type.saturationCurrent())).isEqualTo(type);
  }

  @Test
  void bothReadingsComeBackTogether() {
    TransistorMeasured measured =
        new TransistorMeasured(
            measuredBeta(1e-3, 350).beta(), measuredVoltage(2e-3, 0.67, 31).baseEmitterVoltage());
    FittedTransistor fitted = fit(model(2e-14, 180, NOTHING), null, measured);

    TransistorFigures warm = new TransistorFigures(fitted.parameters(), 304.15);
    assertThat(warm.baseEmitterVoltage(2e-3, 5)).isCloseTo(0.67, within(1e-12));
    assertThat(new TransistorFigures(fitted.parameters()).beta(1e-3, 5))
        .isCloseTo(350, within(1e-7));
  }

  /** Published: with E_G = 1.12 V and X = 3 these voltages all belong to 0.65 V at 25 °C. */
  @ParameterizedTest
  @CsvSource({"0, 0.6955938", "50, 0.6038636", "75, 0.5572267"})
  void aMeasuredVoltageIsReferredBackToTwentyFiveDegrees(double celsius, double reading) {
    TransistorModel stated = model(1e-16, 200, NOTHING);
    double warm =
        fit(stated, null, measuredVoltage(1e-3, reading, celsius)).parameters().saturationCurrent();
    double cool =
        fit(stated, null, measuredVoltage(1e-3, 0.65, 25)).parameters().saturationCurrent();

    // Half a digit, 5e-8 V, is 2e-6 of the current.
    assertThat(warm).isCloseTo(cool, within(2.2e-6 * cool));
  }

  @Test
  void thePartsOwnReadingsWinOneByOneOverTheRecords() {
    TransistorMeasured ofTheRecord =
        new TransistorMeasured(
            measuredBeta(1e-3, 150).beta(), measuredVoltage(1e-3, 0.64, 25).baseEmitterVoltage());
    TransistorRecord record =
        transistor(Optional.empty(), Optional.of(CURVED), Optional.of(ofTheRecord));
    TransistorFigures figures =
        new TransistorFigures(
            TransistorFit.fit(record, Optional.of(measuredBeta(2e-3, 310))).parameters());

    assertThat(figures.beta(2e-3, 5)).isCloseTo(310, within(1e-7));
    assertThat(figures.baseEmitterVoltage(1e-3, 5)).isCloseTo(0.64, within(1e-12));
  }

  @Test
  void aGainFarAboveItsTypesLessensTheRecombinationToo() {
    TransistorDatasheet weak =
        datasheet(List.of(beta(1e-4, 60), beta(1e-2, 170)), voltage(1e-3, 0.65));
    TransistorParameters type = fit(null, weak, null).parameters();
    FittedTransistor fitted = fit(null, weak, measuredBeta(1e-4, 200));

    TransistorFigures figures = new TransistorFigures(fitted.parameters());
    assertThat(figures.beta(1e-4, 5)).isCloseTo(200, within(1e-7));
    double withoutRecombination =
        new TransistorFigures(fitted.parameters().withRecombinationCurrent(0)).beta(1e-4, 5);
    assertThat(withoutRecombination).isCloseTo(400, within(1e-5));
    assertThat(fitted.parameters().recombinationCurrent()).isLessThan(type.recombinationCurrent());
    assertThat(fitted.notes())
        .singleElement()
        .asString()
        .startsWith(
            "At the beta at 100 µA, V_CE = 5 V that was measured the recombination current of the"
                + " type would take 239")
        .endsWith(" of the base current; it is reduced so that it takes half.");
  }

  @Test
  void aTesterCanSupplyWhatTheRecordLacks() {
    TransistorMeasured measured =
        new TransistorMeasured(
            measuredBeta(1e-3, 220).beta(), measuredVoltage(1e-3, 0.65, 25).baseEmitterVoltage());
    TransistorFigures figures = new TransistorFigures(fit(null, null, measured).parameters());

    assertThat(figures.beta(1e-3, 5)).isCloseTo(220, within(1e-7));
    assertThat(figures.baseEmitterVoltage(1e-3, 5)).isCloseTo(0.65, within(1e-12));
  }

  @Test
  void onlyWhatARuleAsksForIsNoted() {
    TransistorDatasheet sheet =
        Records.withCapacitances(
            Records.withTransitionFrequency(
                datasheet(
                    List.of(
                        beta(1e-3, 70, NOTHING, NOTHING),
                        beta(1e-2, 100, NOTHING, 300),
                        beta(0.1, NOTHING, NOTHING, 90)),
                    voltage(1e-3, 0.65)),
                1e-2,
                100e6,
                NOTHING),
            capacitance(5, NOTHING, 4e-12),
            capacitance(0.5, 5e-12, 8e-12));
    FittedTransistor fitted = fit(null, sheet, null);

    assertThat(fitted.notes())
        .containsExactlyInAnyOrder(
            "Of the beta at 1 mA, V_CE = 5 V only a minimum is printed: 1.5 times it, 105, is"
                + " taken as nominal.",
            "Of the beta at 100 mA, V_CE = 5 V only a maximum is printed, which is never fitted: a"
                + " typical value beside it is needed.",
            "Of the transition frequency at 10 mA, V_CE = 5 V only a minimum is printed: 1.5 times"
                + " it, 150 MHz, is taken as nominal.",
            "Of the output capacitance at V_CB = 5 V only a maximum is printed, which is never"
                + " fitted: a typical value beside it is needed.");
    assertThat(fitted.parameters().baseCollectorCapacitance()).isZero();
  }

  @Test
  void whatIsMissingIsSaid() {
    assertThatThrownBy(() -> fit(null, datasheet(List.of(beta(1e-3, 200))), null))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "Found no base-emitter voltage, expected one with a typical value, or a saturation"
                + " current in the model.");
    TransistorDatasheet maximumAlone =
        datasheet(
            List.of(beta(1e-3, 200)),
            new TransistorDatasheet.BaseEmitterVoltage(
                Quantity.of(0.3), none(), none(), of(1.2), false));
    assertThatThrownBy(() -> fit(null, maximumAlone, null))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "Found no base-emitter voltage but base-emitter voltage at 300 mA, V_CE = 5 V with a"
                + " maximum alone, expected one with a typical value, or a saturation current in"
                + " the model.");
    assertThatThrownBy(() -> fit(model(1e-14, NOTHING, NOTHING), null, null))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "Found no beta, expected one with a typical value or a minimum, or a forward beta in"
                + " the model.");
  }

  @Test
  void figuresThatNoTransistorShowsAreRefused() {
    assertThatThrownBy(
            () -> fit(null, datasheet(List.of(beta(1e-3, 200)), voltage(1e-3, 6.5)), null))
        .isInstanceOf(FitException.class)
        .hasMessageStartingWith(
            "The base-emitter voltage at 1 mA, V_CE = 5 V, 6.5 V, is not what a silicon junction"
                + " shows");
    TransistorDatasheet steep =
        datasheet(List.of(beta(0.1, 250), beta(0.3, 60)), voltage(1e-3, 0.65));
    assertThatThrownBy(() -> fit(null, steep, null))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "The beta at 100 mA, V_CE = 5 V, 250, and the beta at 300 mA, V_CE = 5 V, 60, lie"
                + " further apart than recombination and knee current can bring them: a typical"
                + " value is needed in place of one of them.");
    assertThatThrownBy(
            () -> fit(null, Records.withOutputConductance(CURVED, 1e-3, 150e-6, 250e-6), null))
        .isInstanceOf(FitException.class)
        .hasMessageContaining("is more than any Early voltage above zero gives");
    assertThatThrownBy(() -> fit(model(1e-14, 200, 1e-11), null, measuredBeta(1e-5, 300)))
        .isInstanceOf(FitException.class)
        .hasMessageStartingWith("No forward beta gives the beta at 10 µA, V_CE = 5 V, 300");
  }
}
