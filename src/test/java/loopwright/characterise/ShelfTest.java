package loopwright.characterise;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Pin;
import loopwright.part.Polarity;
import loopwright.part.TransistorDatasheet;
import loopwright.part.TransistorRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The shelf that ships with the program: public datasheets of the registered types. */
class ShelfTest {
  static Stream<String> transistors() {
    return ShelfFixture.records().entrySet().stream()
        .filter(entry -> entry.getValue() instanceof TransistorRecord)
        .map(Map.Entry::getKey);
  }

  @Test
  void holdsFourteenTransistorsAndADiode() {
    assertThat(ShelfFixture.records().keySet())
        .containsExactly(
            "2N3904",
            "2N3906",
            "BC547B",
            "BC557B",
            "2N2222A",
            "2N2907A",
            "BC337-25",
            "BC327-25",
            "2N5551",
            "2N5401",
            "BD139",
            "BD140",
            "MPSA42",
            "MPSA92",
            "1N4148");
  }

  @ParameterizedTest
  @MethodSource("transistors")
  void everyFigureUsedComesBack(String type) {
    FittedTransistor fitted = TransistorFit.fit(ShelfFixture.transistor(type), Optional.empty());

    assertThat(fitted.comparison()).extracting(FigureComparison::use).contains(FigureUse.SOLVED);
    for (FigureComparison figure : fitted.comparison()) {
      if (figure.use() == FigureUse.SOLVED) {
        double allowed =
            figure.figure().contains("base-emitter voltage") ? 1e-9 : 1e-6 * figure.printed();
        assertThat(figure.returned())
            .as("%s %s", figure.figure(), figure.bias())
            .isCloseTo(figure.printed(), within(allowed));
      }
    }
    for (String figure :
        List.of("transition frequency", "output capacitance", "input capacitance")) {
      assertThat(fitted.comparison())
          .filteredOn(one -> one.figure().startsWith(figure))
          .singleElement()
          .extracting(FigureComparison::use)
          .isEqualTo(FigureUse.SOLVED);
    }
  }

  /** Least squares of a whole curve may miss a single point, but not by more than a third. */
  @ParameterizedTest
  @MethodSource("transistors")
  void betaCurvesAreFollowed(String type) {
    FittedTransistor fitted = TransistorFit.fit(ShelfFixture.transistor(type), Optional.empty());

    assertThat(fitted.comparison())
        .filteredOn(figure -> figure.use() == FigureUse.LEAST_SQUARES)
        .allSatisfy(
            figure -> assertThat(figure.returned() / figure.printed()).isBetween(1 / 1.34, 1.34));
    assertThat(fitted.parameters().forwardBeta()).isBetween(50.0, 500.0);
  }

  /** A silicon transistor shows 0.6 V to 0.7 V at 1 mA (common practice, no source). */
  @ParameterizedTest
  @MethodSource("transistors")
  void modelsShowTheUsualVoltageAtOneMilliampere(String type) {
    FittedTransistor fitted = TransistorFit.fit(ShelfFixture.transistor(type), Optional.empty());

    assertThat(new TransistorFigures(fitted.parameters()).baseEmitterVoltage(1e-3, 5))
        .isBetween(0.59, 0.70);
  }

  /** Ranges of Early voltages of these types (from memory, orders of magnitude). */
  @ParameterizedTest
  @CsvSource({
    "2N3904, 70, 120", "2N3906, 20, 100", "BC547B, 60, 100", "BC557B, 25, 60",
    "2N2222A, 75, 150", "2N2907A, 60, 120", "BC337-25, 50, 150", "BC327-25, 30, 100",
    "2N5551, 100, 300", "2N5401, 70, 200", "BD139, 100, 300", "BD140, 50, 150",
    "MPSA42, 100, 300", "MPSA92, 70, 200"
  })
  void earlyVoltagesLieInTheirTypesRange(String type, double low, double high) {
    assertThat(
            TransistorFit.fit(ShelfFixture.transistor(type), Optional.empty())
                .parameters()
                .earlyVoltage())
        .isBetween(low, high);
  }

  /** Public datasheets of the registered types: V_CEO, V_EBO, I_C, P_tot, R_thJA. */
  @ParameterizedTest
  @CsvSource({
    "2N3904, NPN, 40, 6, 0.2, 0.625, 200",
    "2N3906, PNP, 40, 5, 0.2, 0.625, 200",
    "BC547B, NPN, 45, 6, 0.1, 0.5, 250",
    "BC557B, PNP, 45, 5, 0.1, 0.5, 250",
    "2N2222A, NPN, 40, 6, 0.8, 0.4, 437.5",
    "2N2907A, PNP, 60, 5, 0.6, 0.4, 325",
    "BC337-25, NPN, 45, 5, 0.8, 0.625, 200",
    "BC327-25, PNP, 45, 5, 0.8, 0.625, 200",
    "2N5551, NPN, 160, 6, 0.6, 0.625, 200",
    "2N5401, PNP, 150, 5, 0.6, 0.625, 200",
    "BD139, NPN, 80, 5, 1.5, 1.25, 100",
    "BD140, PNP, 80, 5, 1.5, 1.25, 100",
    "MPSA42, NPN, 300, 5, 0.3, 0.625, 200",
    "MPSA92, PNP, 300, 5, 0.5, 0.625, 200"
  })
  void limitsAreThoseOfTheDatasheets(
      String type,
      Polarity polarity,
      double collectorEmitter,
      double emitterBase,
      double current,
      double power,
      double thermal) {
    TransistorRecord record = ShelfFixture.transistor(type);

    assertThat(record.kind()).isEqualTo(polarity);
    assertThat(record.limits())
        .hasValueSatisfying(
            limits -> {
              assertThat(limits.collectorEmitterVoltage().orElseThrow().value())
                  .isEqualTo(collectorEmitter);
              assertThat(limits.emitterBaseVoltage().orElseThrow().value()).isEqualTo(emitterBase);
              assertThat(limits.collectorCurrent().orElseThrow().value()).isEqualTo(current);
              assertThat(limits.power().orElseThrow().value()).isEqualTo(power);
              assertThat(limits.thermalResistance().orElseThrow().value()).isEqualTo(thermal);
              // Full power at 25 °C ambient must not take the junction beyond its limit.
              assertThat(limits.junctionTemperature().orElseThrow().value())
                  .isGreaterThanOrEqualTo(25 + power * thermal);
            });
  }

  @Test
  void pinsAreThoseOfTheCases() {
    assertThat(ShelfFixture.transistor("2N3904").pins())
        .containsExactly(Pin.EMITTER, Pin.BASE, Pin.COLLECTOR);
    assertThat(ShelfFixture.transistor("BC547B").pins())
        .containsExactly(Pin.COLLECTOR, Pin.BASE, Pin.EMITTER);
    assertThat(ShelfFixture.transistor("BD139").pins())
        .containsExactly(Pin.EMITTER, Pin.COLLECTOR, Pin.BASE);
    for (String type : List.of("2N2222A", "2N2907A")) {
      assertThat(ShelfFixture.transistor(type).source().orElseThrow()).contains("TO-18");
    }
  }

  /** A minimum alone is taken 1.5 times and the record's own text says so; nothing else is. */
  @ParameterizedTest
  @MethodSource("transistors")
  void aMinimumAloneIsNotedAndNothingElse(String type) {
    TransistorRecord record = ShelfFixture.transistor(type);
    TransistorDatasheet sheet = record.datasheet().orElseThrow();
    long minimaAlone =
        sheet.beta().stream()
                .filter(beta -> beta.typical().isEmpty() && beta.maximum().isEmpty())
                .count()
            + sheet.transitionFrequency().stream()
                .filter(frequency -> frequency.typical().isEmpty())
                .count();
    FittedTransistor fitted = TransistorFit.fit(record, Optional.empty());

    assertThat(fitted.notes()).hasSize((int) minimaAlone);
    assertThat(fitted.notes()).allMatch(note -> note.contains("1.5 times it"));
    assertThat(record.source().orElseThrow().contains("1.5 times")).isEqualTo(minimaAlone > 0);
  }

  @Test
  void noMaximumStandsAlone() {
    List<String> alone = new ArrayList<>();
    ShelfFixture.parts()
        .properties()
        .forEach(part -> maximaAlone(part.getKey(), part.getValue(), alone));

    assertThat(alone).isEmpty();
  }

  @Test
  void everyRecordSaysWhereItsFiguresComeFrom() {
    Map<String, PartRecord> records = new TreeMap<>(ShelfFixture.records());

    assertThat(records)
        .allSatisfy(
            (type, record) -> {
              String source = record.source().orElseThrow();
              assertThat(source)
                  .startsWith("Public datasheets of the registered type " + type + ": ")
                  .contains(" From memory: ");
              String memory = source.substring(source.indexOf("From memory"));
              assertThat(memory)
                  .contains(record instanceof DiodeRecord ? "typical capacitance" : "Early voltage")
                  .contains("pin order");
            });
  }

  private static void maximaAlone(String place, JsonNode node, List<String> found) {
    if (node.has("maximum") && !node.has("typical") && !node.has("minimum")) {
      found.add(place);
    }
    node.properties()
        .forEach(field -> maximaAlone(place + "." + field.getKey(), field.getValue(), found));
    if (node.isArray()) {
      node.forEach(item -> maximaAlone(place, item, found));
    }
  }
}
