package loopwright.characterise;

import static loopwright.characterise.Records.beta;
import static loopwright.characterise.Records.capacitance;
import static loopwright.characterise.Records.datasheet;
import static loopwright.characterise.Records.none;
import static loopwright.characterise.Records.of;
import static loopwright.characterise.Records.transistor;
import static loopwright.characterise.Records.voltage;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorParameters;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;

/**
 * Each rule against its closed form where one exists: the ideal transistor of Ebers and Moll
 * (Proceedings of the IRE 42, 1954, 1761–1772) with the base charge of Gummel and Poon (Bell System
 * Technical Journal 49, 1970, 827–852). The shunts of 1e-13 S weigh some 1e-7 of the base current
 * at 1 mA and 4e-6 of it at 10 µA.
 */
class TransistorFitTest {
  /** kT/q at 25 °C with the constants of the SI of 2019, V. */
  private static final double THERMAL_VOLTAGE = 25.692579121e-3;

  private static final TransistorDatasheet PLAIN =
      datasheet(List.of(beta(1e-3, 200)), voltage(1e-3, 0.65));

  private static FittedTransistor fit(TransistorDatasheet sheet) {
    return TransistorFit.fit(transistor(sheet), Optional.empty());
  }

  @Test
  void oneVoltageAndOneBetaGiveTheIdealTransistor() {
    FittedTransistor fitted = fit(PLAIN);

    double expected = 1e-3 / Math.expm1(0.65 / THERMAL_VOLTAGE);
    assertThat(fitted.parameters().saturationCurrent())
        .isCloseTo(expected, within(1e-8 * expected));
    assertThat(fitted.parameters().forwardBeta()).isCloseTo(200, within(2e-5));
    assertThat(fitted.parameters().kneeCurrent()).isInfinite();
    assertThat(fitted.parameters().recombinationCurrent()).isZero();
    assertThat(fitted.notes()).isEmpty();
  }

  @Test
  void whatNothingSaysIsLeftAtItsDefault() {
    TransistorParameters fitted = fit(PLAIN).parameters();

    assertThat(
            fitted
                .withSaturationCurrent(TransistorParameters.DEFAULTS.saturationCurrent())
                .withForwardBeta(TransistorParameters.DEFAULTS.forwardBeta()))
        .isEqualTo(TransistorParameters.DEFAULTS);
  }

  @Test
  void aBetaThatIsLowerAtTheLowerCurrentTellsTheRecombination() {
    TransistorParameters fitted =
        fit(datasheet(List.of(beta(1e-5, 100), beta(1e-3, 200)), voltage(1e-3, 0.65))).parameters();

    // 1/β = 1/β_F + I_rec/√(I_S I_C) at ideality 2 (Sah, Noyce and Shockley 1957): the second term
    // is ten times larger at a hundredth of the current, so 1/100 − 1/200 is nine of its tenths.
    double share = (1 / 100.0 - 1 / 200.0) / 9;
    double recombination = share * Math.sqrt(fitted.saturationCurrent() * 1e-3);
    assertThat(1 / fitted.forwardBeta()).isCloseTo(1 / 200.0 - share, within(3e-8));
    // The exponential less one is 3e-5 below the exponential at 10 µA.
    assertThat(fitted.recombinationCurrent())
        .isCloseTo(recombination, within(5e-5 * recombination));
    assertThat(fitted.kneeCurrent()).isInfinite();
  }

  @Test
  void aBetaThatIsLowerAtTheHigherCurrentTellsTheKnee() {
    TransistorParameters fitted =
        fit(datasheet(List.of(beta(0.1, 250), beta(0.3, 160)), voltage(1e-3, 0.65))).parameters();

    // Without Early effect q_b = 1 + I_C/I_K exactly, so β = β_F/(1 + I_C/I_K).
    double knee = (0.3 * 160 - 0.1 * 250) / (250 - 160);
    assertThat(fitted.kneeCurrent()).isCloseTo(knee, within(1e-6 * knee));
    assertThat(fitted.forwardBeta()).isCloseTo(250 * (1 + 0.1 / knee), within(1e-4));
    assertThat(fitted.recombinationCurrent()).isZero();
  }

  @Test
  void betasAtFiveCurrentsGiveBackTheParametersThatTheyCameFrom() {
    TransistorParameters known =
        TransistorParameters.DEFAULTS
            .withSaturationCurrent(5e-15)
            .withForwardBeta(320)
            .withKneeCurrent(0.08)
            .withRecombinationCurrent(2e-12);
    TransistorFigures figures = new TransistorFigures(known);
    FittedTransistor fitted =
        fit(
            datasheet(
                List.of(1e-5, 1e-4, 1e-3, 1e-2, 1e-1).stream()
                    .map(current -> beta(current, figures.beta(current, 5)))
                    .toList(),
                voltage(1e-3, figures.baseEmitterVoltage(1e-3, 5))));

    TransistorParameters found = fitted.parameters();
    assertThat(found.saturationCurrent()).isCloseTo(5e-15, within(5e-22));
    assertThat(found.forwardBeta()).isCloseTo(320, within(1e-4));
    assertThat(found.kneeCurrent()).isCloseTo(0.08, within(1e-7));
    assertThat(found.recombinationCurrent()).isCloseTo(2e-12, within(1e-18));
    assertThat(fitted.comparison()).allMatch(figure -> figure.use() == FigureUse.SOLVED);
  }

  @Test
  void betasThatNoParametersGiveAreFittedByLeastSquares() {
    FittedTransistor fitted =
        fit(
            datasheet(
                List.of(beta(1e-4, 100), beta(1e-3, 180), beta(2e-3, 120), beta(1e-2, 200)),
                voltage(1e-3, 0.65)));

    List<FigureComparison> betas =
        fitted.comparison().stream().filter(figure -> figure.figure().equals("beta")).toList();
    assertThat(betas).hasSize(4).allMatch(figure -> figure.use() == FigureUse.LEAST_SQUARES);
    // β_F may still move freely, so at the least sum of squares the logarithms balance.
    double balance =
        betas.stream()
            .mapToDouble(
                figure ->
                    Math.log(figure.returned() / figure.printed())
                        * sensitivity(fitted.parameters(), figure))
            .sum();
    assertThat(balance).isCloseTo(0, within(1e-7));
  }

  /** ∂ ln β/∂ ln β_F at the current of the figure. */
  private static double sensitivity(TransistorParameters at, FigureComparison figure) {
    double current =
        Quantity.parse(
                figure.bias().substring("at ".length(), figure.bias().indexOf(',')), Unit.AMPERE)
            .value();
    double above =
        new TransistorFigures(at.withForwardBeta(at.forwardBeta() * 1.0001)).beta(current, 5);
    double below =
        new TransistorFigures(at.withForwardBeta(at.forwardBeta() / 1.0001)).beta(current, 5);
    return Math.log(above / below) / (2 * Math.log(1.0001));
  }

  /**
   * At 10 mA and 300 MHz 1/(2π f_T) is 530.51648 ps and C_π + C_µ 206.48627 pF: Gray, Hurst, Lewis
   * and Meyer, chapter 1 (from memory).
   */
  @Test
  void theTransitionFrequencyGivesTheTransitTime() {
    TransistorDatasheet sheet = Records.withTransitionFrequency(PLAIN, 10e-3, Double.NaN, 300e6);

    TransistorParameters bare = fit(sheet).parameters();
    assertThat(bare.transitTime()).isCloseTo(530.51648e-12, within(0.5e-17));
    assertThat(bare.transitTime() * 10e-3 / THERMAL_VOLTAGE)
        .isCloseTo(206.48627e-12, within(0.5e-17));

    TransistorParameters loaded =
        fit(Records.withCapacitances(
                sheet, capacitance(5, 2.5e-12, Double.NaN), capacitance(0.5, 8e-12, Double.NaN)))
            .parameters();
    double zeroBias = 8e-12 * Math.cbrt(1 + 0.5 / 0.7);
    double atBase = THERMAL_VOLTAGE * Math.log(10e-3 / loaded.saturationCurrent());
    // The tangent at 0.42 V: factor (1 − 0.6)^(−1/3), slope a third of it over 0.28 V.
    double factor = 1 / Math.cbrt(0.4);
    double baseEmitter = zeroBias * factor * (1 + (atBase - 0.42) / (3 * 0.28));
    double baseCollector = 2.5e-12 * Math.cbrt(1 + 5 / 0.7) / Math.cbrt(1 + (5 - atBase) / 0.7);
    double expected = 530.51648e-12 - (baseEmitter + baseCollector) * THERMAL_VOLTAGE / 10e-3;
    assertThat(loaded.transitTime()).isCloseTo(expected, within(1e-17));
    assertThat(loaded.baseEmitterCapacitance()).isCloseTo(zeroBias, within(1e-23));
  }

  @Test
  void theTransitTimeIsNeverNegative() {
    FittedTransistor fitted =
        fit(
            Records.withCapacitances(
                Records.withTransitionFrequency(PLAIN, 1e-3, Double.NaN, 300e6),
                capacitance(5, 4e-12, Double.NaN),
                capacitance(0.5, 20e-12, Double.NaN)));

    assertThat(fitted.parameters().transitTime()).isZero();
    assertThat(fitted.notes())
        .singleElement()
        .asString()
        .startsWith(
            "The transition frequency at 1 mA, V_CE = 5 V, 300 MHz, is more than the junction"
                + " capacitances allow: the transit time is set to zero, which gives ");
    assertThat(comparison(fitted, "transition frequency").use()).isEqualTo(FigureUse.COMPARED);
    assertThat(comparison(fitted, "transition frequency").returned()).isLessThan(300e6);
  }

  /** V_A = I_C/h_oe − V_CE is 15 V here; in the equations V_BE comes on top. */
  @Test
  void theOutputConductanceGivesTheEarlyVoltage() {
    FittedTransistor fitted = fit(Records.withOutputConductance(PLAIN, 1e-3, 20e-6, 60e-6));

    FigureComparison conductance =
        comparison(fitted, "output conductance (mean of minimum and maximum)");
    assertThat(conductance.printed()).isCloseTo(40e-6, within(1e-18));
    assertThat(conductance.returned()).isCloseTo(40e-6, within(4e-14));
    double voltage = new TransistorFigures(fitted.parameters()).baseEmitterVoltage(1e-3, 10);
    assertThat(fitted.parameters().earlyVoltage() - voltage).isCloseTo(15, within(1e-4));
  }

  @Test
  void aPrintedEarlyVoltageWinsOverTheOutputConductance() {
    FittedTransistor fitted =
        fit(Records.withEarlyVoltage(Records.withOutputConductance(PLAIN, 1e-3, 1e-6, 40e-6), 90));

    assertThat(fitted.parameters().earlyVoltage()).isEqualTo(90);
    assertThat(comparison(fitted, "output conductance (mean of minimum and maximum)").use())
        .isEqualTo(FigureUse.COMPARED);
  }

  @Test
  void everythingTogetherComesBackWithResistancesAndInSaturation() {
    TransistorDatasheet sheet =
        Records.withOutputConductance(
            Records.withTransitionFrequency(
                Records.withCapacitances(
                    datasheet(
                        List.of(beta(1e-4, 120), beta(1e-2, 180), beta(0.2, 90)),
                        new TransistorDatasheet.BaseEmitterVoltage(
                            Quantity.of(0.15), none(), of(0.95), none(), true)),
                    capacitance(10, 5e-12, Double.NaN),
                    capacitance(0.5, 18e-12, Double.NaN)),
                20e-3,
                Double.NaN,
                250e6),
            1e-3,
            5e-6,
            35e-6);
    FittedTransistor fitted =
        TransistorFit.fit(
            transistor(
                Optional.of(Records.resistances(8, 0.3, 0.5, 5)),
                Optional.of(sheet),
                Optional.empty()),
            Optional.empty());

    assertThat(fitted.parameters().reverseBeta()).isEqualTo(5);
    assertThat(fitted.comparison()).hasSize(8);
    for (FigureComparison figure : fitted.comparison()) {
      assertThat(figure.use()).as(figure.figure()).isEqualTo(FigureUse.SOLVED);
      assertThat(figure.returned())
          .as(figure.figure())
          .isCloseTo(figure.printed(), within(1e-9 * figure.printed()));
    }
  }

  private static FigureComparison comparison(FittedTransistor fitted, String figure) {
    return fitted.comparison().stream()
        .filter(one -> one.figure().equals(figure))
        .findFirst()
        .orElseThrow();
  }
}
