package loopwright.characterise;

import static loopwright.characterise.Records.diode;
import static loopwright.characterise.Records.forward;
import static loopwright.characterise.Records.none;
import static loopwright.characterise.Records.of;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loopwright.part.DiodeDatasheet;
import loopwright.part.DiodeModel;
import loopwright.part.DiodeParameters;
import org.junit.jupiter.api.Test;

/** Against Shockley's law (Bell System Technical Journal 28, 1949, 435–489) in closed form. */
class DiodeFitTest {
  /** kT/q at 25 °C with the constants of the SI of 2019, V. */
  private static final double THERMAL_VOLTAGE = 25.692579121e-3;

  private static final double NOTHING = Double.NaN;

  @Test
  void twoForwardVoltagesGiveSaturationCurrentAndIdeality() {
    FittedDiode fitted = DiodeFit.fit(diode(forward(1e-3, 0.6, NOTHING), forward(1e-2, 0.72, 1)));

    // n V_T ln 10 is the rise over a decade; the −1 of the law weighs 1e-5 at 1 mA.
    double ideality = 0.12 / (THERMAL_VOLTAGE * Math.log(10));
    assertThat(fitted.parameters().ideality()).isCloseTo(ideality, within(1e-5 * ideality));
    double saturation = 1e-3 / Math.expm1(0.6 / (fitted.parameters().ideality() * THERMAL_VOLTAGE));
    assertThat(fitted.parameters().saturationCurrent())
        .isCloseTo(saturation, within(1e-9 * saturation));
    assertThat(fitted.comparison())
        .hasSize(2)
        .allSatisfy(
            figure -> {
              assertThat(figure.use()).isEqualTo(FigureUse.SOLVED);
              assertThat(figure.returned()).isCloseTo(figure.printed(), within(1e-12));
            });
    assertThat(fitted.notes()).isEmpty();
  }

  @Test
  void oneForwardVoltageGoesWithAnIdealityOfOnePointEight() {
    DiodeParameters fitted = DiodeFit.fit(diode(forward(1e-2, 0.72, NOTHING))).parameters();

    assertThat(fitted.ideality()).isEqualTo(1.8);
    double saturation = 1e-2 / Math.expm1(0.72 / (1.8 * THERMAL_VOLTAGE));
    assertThat(fitted.saturationCurrent()).isCloseTo(saturation, within(1e-9 * saturation));
  }

  @Test
  void moreForwardVoltagesAreFittedByLeastSquares() {
    FittedDiode fitted =
        DiodeFit.fit(
            diode(
                forward(1e-3, 0.60, NOTHING),
                forward(1e-2, 0.72, NOTHING),
                forward(1e-1, 0.90, NOTHING)));

    // Equally spaced in ln I, so the slope is half the end-to-end rise: 0.15 V a decade; the mean
    // is at 10 mA.
    double ideality = 0.15 / (THERMAL_VOLTAGE * Math.log(10));
    assertThat(fitted.parameters().ideality()).isCloseTo(ideality, within(2e-4 * ideality));
    assertThat(fitted.comparison())
        .extracting(FigureComparison::use)
        .containsOnly(FigureUse.LEAST_SQUARES);
    assertThat(fitted.comparison().get(1).returned()).isCloseTo(0.74, within(1e-4));
  }

  @Test
  void theDropAcrossASeriesResistanceIsTakenOff() {
    DiodeModel model = model(NOTHING, 2, 5, NOTHING, NOTHING);
    DiodeParameters fitted =
        DiodeFit.fit(diode(Optional.of(model), sheet(forward(1e-2, 0.77, NOTHING)))).parameters();

    double saturation = 1e-2 / Math.expm1(0.72 / (2 * THERMAL_VOLTAGE));
    assertThat(fitted.seriesResistance()).isEqualTo(5);
    assertThat(fitted.saturationCurrent()).isCloseTo(saturation, within(1e-9 * saturation));
  }

  /** t_rr = τ ln 2 by charge control with equal currents (common practice, no source). */
  @Test
  void theRecoveryTimeGivesTheTransitTime() {
    FittedDiode fitted =
        DiodeFit.fit(
            diode(
                Optional.empty(),
                Optional.of(
                    new DiodeDatasheet(
                        List.of(forward(1e-2, 0.72, NOTHING)), of(2e-12), of(4e-9)))));

    assertThat(fitted.parameters().transitTime()).isCloseTo(5.77078e-9, within(5e-15));
    assertThat(fitted.parameters().capacitance()).isEqualTo(2e-12);
    assertThat(fitted.comparison().subList(1, 3))
        .allSatisfy(
            figure ->
                assertThat(figure.returned())
                    .isCloseTo(figure.printed(), within(1e-12 * figure.printed())));
  }

  @Test
  void whatTheModelStatesHolds() {
    DiodeModel model = model(1e-9, NOTHING, NOTHING, 3e-12, 1e-9);
    DiodeParameters fitted =
        DiodeFit.fit(
                diode(
                    Optional.of(model),
                    Optional.of(
                        new DiodeDatasheet(
                            List.of(forward(1e-3, 0.6, NOTHING), forward(1e-2, 0.72, NOTHING)),
                            of(2e-12),
                            of(4e-9)))))
            .parameters();

    assertThat(fitted.saturationCurrent()).isEqualTo(1e-9);
    assertThat(fitted.capacitance()).isEqualTo(3e-12);
    assertThat(fitted.transitTime()).isEqualTo(1e-9);
    assertThat(fitted.ideality()).isBetween(1.5, 2.0);
    assertThat(
            DiodeFit.fit(
                    diode(
                        Optional.of(model(2.5e-9, NOTHING, NOTHING, NOTHING, NOTHING)),
                        Optional.empty()))
                .parameters())
        .isEqualTo(new DiodeParameters(2.5e-9, 1, 0, 0, 0));
  }

  @Test
  void aMaximumAloneIsNotedAndNeverFitted() {
    FittedDiode fitted =
        DiodeFit.fit(diode(forward(1e-2, 0.72, NOTHING), forward(0.1, NOTHING, 1)));

    assertThat(fitted.parameters().ideality()).isEqualTo(1.8);
    assertThat(fitted.notes())
        .containsExactly(
            "Of the forward voltage at 100 mA only a maximum is printed, which is never fitted: a"
                + " typical value beside it is needed.");
    assertThatThrownBy(() -> DiodeFit.fit(diode(forward(1e-2, NOTHING, 1))))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "Found no forward voltage with a typical value, expected one, or a saturation current"
                + " in the model.");
  }

  @Test
  void voltagesThatNoJunctionShowsAreRefused() {
    assertThatThrownBy(
            () -> DiodeFit.fit(diode(forward(1e-3, 0.72, NOTHING), forward(1e-2, 0.6, NOTHING))))
        .isInstanceOf(FitException.class)
        .hasMessage(
            "No junction gives forward voltage at 1 mA, 720 mV and forward voltage at 10 mA, 600"
                + " mV.");
  }

  private static Optional<DiodeDatasheet> sheet(DiodeDatasheet.ForwardVoltage voltage) {
    return Optional.of(new DiodeDatasheet(List.of(voltage), none(), none()));
  }

  private static DiodeModel model(
      double saturation, double ideality, double resistance, double capacitance, double transit) {
    return new DiodeModel(
        of(saturation), of(ideality), of(resistance), of(capacitance), of(transit));
  }
}
