package loopwright.design;

import static loopwright.design.SampleDesigns.bare;
import static loopwright.design.SampleDesigns.figures;
import static loopwright.design.SampleDesigns.full;
import static loopwright.design.SampleDesigns.hookup;
import static loopwright.design.SampleDesigns.part;
import static loopwright.design.SampleDesigns.quantity;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.part.Polarity;
import loopwright.part.TransistorMeasured;
import loopwright.quantity.Quantity;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every rule once broken, where it must say so in one place, and once kept. */
class DesignValidationTest {
  static List<Design> sound() {
    return List.of(
        bare(),
        full(),
        SampleDesigns.variant(),
        figures(),
        SampleDesigns.bareTurnedOver(),
        with(
            bare(),
            "amplifier.inputPair.tail",
            tail("N", Optional.of(FeedFrom.OPPOSITE_RAIL)),
            "rails",
            SampleDesigns.rails("9", "0")),
        with(
            SampleDesigns.bareTurnedOver(),
            "amplifier.inputPair.tail",
            tail("P", Optional.of(FeedFrom.GROUND)),
            "rails",
            SampleDesigns.rails("9", "0")),
        with(
            full(),
            "bench.readings",
            List.of(reading(Optional.empty(), "resistance", "hookups.gain.feedback.upper"))),
        with(full(), "bench.instruments.meter.displayLoad", quantity("infinite")));
  }

  @ParameterizedTest
  @MethodSource("sound")
  void findsNothingWrongWithASoundDesign(Design design) {
    assertThat(DesignValidation.check(design)).isEmpty();
    assertThat(DesignValidation.requireSound(design)).isSameAs(design);
  }

  @ParameterizedTest
  @CsvSource({
    "amplifier.inputPair.tail.transistor, P, an npn transistor for tail.q1 beside an npn pair",
    "amplifier.inputPair.load.transistor, N, a pnp transistor for pair.q3 beside an npn pair",
    "amplifier.gainStage.transistor, N, a pnp transistor for gain.q1 beside an npn pair",
    "amplifier.gainStage.buffer.transistor, N, a pnp transistor for gain.buffer beside an npn pair",
    "amplifier.gainStage.load.transistor, P, an npn transistor for gainLoad.q1 beside an npn pair",
    "amplifier.gainStage.load.diode, N, a diode for gainLoad.d1",
    "amplifier.outputStage.upper, P, an npn transistor for out.upper",
    "amplifier.outputStage.lower, N, a pnp transistor for out.lower",
    "amplifier.outputStage.drivers.upper, P, an npn transistor for driver.upper",
    "amplifier.outputStage.drivers.lower, N, a pnp transistor for driver.lower",
    "amplifier.outputStage.bias.transistor, P, an npn transistor for bias.q1",
    "amplifier.outputStage.upper, D, a transistor for out.upper",
    "amplifier.inputPair.transistor, D, a transistor for pair.q1",
    "devices.pair.q1.part, P, an npn transistor for pair.q1 beside an npn pair",
    "devices.gainLoad.d2.part, P, a diode for gainLoad.d2"
  })
  void namesThePlaceOfAWrongPolarity(String path, String part, String expected) {
    String kind =
        Map.of("N", "an npn transistor", "P", "a pnp transistor", "D", "a diode").get(part);
    assertThat(DesignValidation.check(with(full(), path, part)))
        .contains(new Problem(path, "found \"" + part + "\", " + kind + ", expected " + expected))
        .allMatch(problem -> problem.path().equals(path));
  }

  @Test
  void turnsThePolaritiesOverWithThePair() {
    Design design =
        with(
            SampleDesigns.bareTurnedOver(),
            "amplifier.gainStage.load",
            new CurrentSource.TwoTransistor("N", part("10k"), part("680"), Optional.empty()));
    assertThat(DesignValidation.check(design))
        .extracting(Problem::message)
        .containsExactly(
            "amplifier.gainStage.load.transistor: found \"N\", an npn transistor, expected a pnp"
                + " transistor for gainLoad.q1 beside a pnp pair",
            "amplifier.gainStage.load.transistor: found \"N\", an npn transistor, expected a pnp"
                + " transistor for gainLoad.q2 beside a pnp pair");
  }

  static List<Arguments> broken() {
    return List.of(
        broken(
            with(bare(), "rails", SampleDesigns.rails("0", "0")),
            "rails.positive",
            "found 0 with a negative rail of 0, expected a positive rail above the negative one"),
        broken(
            with(bare(), "surroundings.ambient", quantity("-300")),
            "surroundings.ambient",
            "found -300, expected a temperature above -273.15 °C"),
        broken(
            with(
                full(),
                "rails.midRail",
                null,
                "hookups.open.source.biasTo",
                ReturnNode.GROUND,
                "hookups.gain.feedback.returnTo",
                ReturnNode.GROUND),
            "amplifier.inputPair.tail.feedFrom",
            "found midRail without a mid-rail, expected rails.midRail in the design"),
        broken(
            with(bare(), "hookups.follower.source.biasTo", ReturnNode.MID_RAIL),
            "hookups.follower.source.biasTo",
            "found midRail without a mid-rail, expected rails.midRail in the design"),
        broken(
            with(bare(), "hookups.follower.feedback.returnTo", ReturnNode.MID_RAIL),
            "hookups.follower.feedback.returnTo",
            "found midRail without a mid-rail, expected rails.midRail in the design"),
        broken(
            with(
                bare(),
                "amplifier.inputPair.tail",
                tail("N", Optional.of(FeedFrom.GROUND)),
                "rails",
                SampleDesigns.rails("9", "0")),
            "amplifier.inputPair.tail.feedFrom",
            "found ground, which is the rail that the source pulls to, expected oppositeRail, or"
                + " midRail with rails.midRail"),
        broken(
            with(bare(), "amplifier.gainStage.transistor", "unheard"),
            "amplifier.gainStage.transistor",
            "found \"unheard\", which is no known part, expected the name of a part record in this"
                + " file or on the shelf"),
        broken(
            with(full(), "devices.pair.q1.part", "unheard"),
            "devices.pair.q1.part",
            "found \"unheard\", which is no known part, expected the name of a part record in this"
                + " file or on the shelf"),
        broken(
            with(full(), "drawer.transistors", List.of("N", "unheard")),
            "drawer.transistors.1",
            "found \"unheard\", which is no known part, expected the name of a part record in this"
                + " file or on the shelf"),
        broken(
            with(bare(), "devices.pair.q3.part", "P"),
            "devices.pair.q3",
            "found a device that the amplifier does not have, expected one of pair.q1, pair.q2,"
                + " gain.q1, out.upper, out.lower"),
        broken(
            with(figures(), "devices.pair.q1.part", "N"),
            "devices.pair.q1",
            "found a device that the amplifier does not have, expected none, for its devices are"
                + " not known"),
        broken(
            with(bare(), "devices.pair.q1", new DeviceChoice(Optional.empty(), Optional.empty())),
            "devices.pair.q1",
            "found neither part nor measured, expected at least one of the two"),
        broken(
            with(full(), "devices.gainLoad.d1.measured", SampleDesigns.measured()),
            "devices.gainLoad.d1.measured",
            "found a transistor's readings for a diode, expected a part only"),
        broken(
            with(full(), "amplifier.gainStage.load.count", 0),
            "amplifier.gainStage.load.count",
            "found 0, expected a whole number from 1 to 100 of diodes"),
        broken(
            with(full(), "amplifier.gainStage.load.count", 1_000_000),
            "amplifier.gainStage.load.count",
            "found 1000000, expected a whole number from 1 to 100 of diodes"),
        broken(
            with(
                bare(),
                "amplifier.inputPair.tail",
                resistor(Optional.empty(), Optional.of(quantity("-1")))),
            "amplifier.inputPair.tail.resistance.measured",
            "found \"-1\", expected a resistance in Ω that is more than zero"),
        broken(
            with(bare(), "amplifier.gainStage.emitterResistance.measured", quantity("0")),
            "amplifier.gainStage.emitterResistance.measured",
            "found 0, expected a measured value above zero"),
        broken(
            with(
                bare(),
                "amplifier.inputPair.tail",
                resistor(Optional.of(quantity("200%")), Optional.empty())),
            "amplifier.inputPair.tail.resistance.tolerance",
            "found \"200%\", expected a plain number that is a fraction from 0 to 1, or per cent"),
        broken(
            with(bare(), "hookups", List.of()),
            "hookups",
            "found none, expected at least one hookup"),
        broken(
            with(bare(), "hookups.follower.name", "a.b"),
            "hookups.a.b",
            "found a dot in the name \"a.b\", expected a name without dots"),
        broken(
            with(bare(), "hookups.follower.name", " "),
            "hookups",
            "found an empty name, expected a name"),
        broken(
            with(
                bare(),
                "hookups",
                List.of(
                    hookup("one", SampleDesigns.follower()),
                    hookup("one", SampleDesigns.follower()))),
            "hookups.one",
            "found the name \"one\" twice, expected every name once"),
        broken(
            with(full(), "extras.trim.name", "lag"),
            "extras.lag",
            "found the name \"lag\" twice, expected every name once"),
        broken(
            with(full(), "extras.trim.to", "pairOther"),
            "extras.trim.to",
            "found \"pairOther\" at both ends, expected another node"),
        broken(
            with(full(), "extras.trim.to", "nowhere"),
            "extras.trim.to",
            "found \"nowhere\", which is no node, expected one of "
                + String.join(", ", NodeNames.ALL)),
        broken(
            with(full(), "hookups.open.probes.0.node", "nowhere"),
            "hookups.open.probes.0.node",
            "found \"nowhere\", which is no node, expected one of "
                + String.join(", ", NodeNames.ALL)),
        broken(
            with(full(), "tolerances.ambient.minimum", quantity("40")),
            "tolerances.ambient.maximum",
            "found 35 below the minimum of 40, expected a maximum not below the minimum"),
        broken(
            with(full(), "tolerances.beta", new Tolerances.BetaSpread.ByFraction(quantity("150%"))),
            "tolerances.beta",
            "found \"150%\", expected a plain number that is a fraction from 0 to 1, or per cent"),
        broken(
            with(figures(), "amplifier.outputLow", quantity("11")),
            "amplifier.outputHigh",
            "found 10 with a lowest output of 11, expected a highest output above the lowest"),
        broken(
            with(full(), "drawer.resistors", new Drawer.Stock.Series("E13")),
            "drawer.resistors",
            "found \"E13\", expected a series from E3 to E96"),
        broken(
            with(
                full(),
                "drawer.capacitors",
                new Drawer.Stock.Values(List.of(quantity("22p"), quantity("-1p")))),
            "drawer.capacitors.1",
            "found \"-1p\", expected a capacitance in F that is more than zero"));
  }

  static List<Arguments> brokenBench() {
    String meter = "bench.instruments.meter";
    String first = "bench.readings.0";
    return List.of(
        broken(
            with(full(), "limits.0.hookup", "lost"),
            "limits.0.hookup",
            "found \"lost\", which is no hookup of this design, expected one of gain, inverting,"
                + " open"),
        broken(
            with(full(), "limits.0.node", "out"),
            "limits.0",
            "found figure and node, expected one of the two"),
        broken(
            with(full(), "limits.0.figure", null),
            "limits.0",
            "found neither figure nor node, expected one of the two"),
        broken(
            with(full(), "limits.0.minimum", null, "limits.0.maximum", null),
            "limits.0",
            "found neither minimum nor maximum, expected at least one of the two"),
        broken(
            with(full(), "limits.0.minimum", quantity("11")),
            "limits.0.maximum",
            "found 10 below the minimum of 11, expected a maximum not below the minimum"),
        broken(
            with(full(), "limits.0.guard", quantity("-1")),
            "limits.0.guard",
            "found -1, expected a guard of zero or more"),
        broken(
            with(full(), meter + ".resolution", null),
            meter + ".digits",
            "found digits without the value of one, expected resolution beside it"),
        broken(
            with(full(), meter + ".range", null, meter + ".divisions", null),
            meter + ".percentOfRange",
            "found a share of the range without a range, expected range, or divisions and"
                + " voltsPerDivision"),
        broken(
            with(full(), meter + ".displayLoad", quantity("600")),
            meter + ".displayLoad",
            "found 600, expected 50 or infinite"),
        broken(
            with(full(), first + ".hookup", "lost"),
            first + ".hookup",
            "found \"lost\", which is no hookup of this design, expected one of gain, inverting,"
                + " open"),
        broken(
            with(full(), first + ".hookup", null),
            first + ".hookup",
            "found none for a reading of nodeVoltage, expected the hookup that was built; only a"
                + " loose part has none"),
        broken(
            with(full(), first + ".node", null),
            first + ".node",
            "found none, expected the node for a reading of nodeVoltage"),
        broken(
            with(full(), first + ".quantity", "baseEmitterVoltage", first + ".device", null),
            first + ".device",
            "found none, expected the device for a reading of baseEmitterVoltage"),
        broken(
            with(full(), first + ".quantity", "supplyCurrent", first + ".rail", null),
            first + ".rail",
            "found none, expected the rail for a reading of supplyCurrent"),
        broken(
            with(full(), first + ".quantity", "resistance", first + ".part", null),
            first + ".part",
            "found none, expected the part for a reading of resistance"),
        broken(
            with(full(), first + ".device", "pair.q9"),
            first + ".device",
            "found \"pair.q9\", which is no device of the amplifier, expected a role such as"
                + " pair.q1"),
        broken(
            with(full(), first + ".part", "rails.positive"),
            first + ".part",
            "found \"rails.positive\", which is no part of this design, expected the path of a"
                + " resistor or capacitor, a device role, or the name of a part"),
        broken(
            with(full(), first + ".instrument", "scope"),
            first + ".instrument",
            "found \"scope\", which is no instrument of this bench, expected one of meter"),
        broken(
            with(full(), first + ".uncertainty", quantity("0")),
            first + ".uncertainty",
            "found 0, expected an uncertainty above zero"),
        broken(
            with(full(), "bench.curves.step.hookup", "lost"),
            "bench.curves.step.hookup",
            "found \"lost\", which is no hookup of this design, expected one of gain, inverting,"
                + " open"),
        broken(
            with(
                full(),
                "bench.curves.step.columns.1",
                new Curve.Column("out", "V", List.of(quantity("0")))),
            "bench.curves.step.columns",
            "found columns of different length, expected as many values in every column"));
  }

  @ParameterizedTest
  @MethodSource({"broken", "brokenBench"})
  void namesPlaceFoundAndExpected(Design design, Problem expected) {
    assertThat(DesignValidation.check(design)).containsExactly(expected);
  }

  @Test
  void throwsEverythingThatIsWrongAtOnce() {
    Design design =
        with(bare(), "amplifier.outputStage.upper", "P", "amplifier.outputStage.lower", "N");
    assertThatThrownBy(() -> DesignValidation.requireSound(design))
        .isInstanceOf(DesignException.class)
        .hasMessageStartingWith("amplifier.outputStage.upper: found \"P\"")
        .satisfies(thrown -> assertThat(((DesignException) thrown).problems()).hasSize(2));
  }

  @Test
  void aDeviceOfItsOwnDoesNotExcuseTheStagesPart() {
    Map<String, DeviceChoice> devices = new LinkedHashMap<>();
    devices.put(
        "gain.q1", new DeviceChoice(Optional.of("P"), Optional.<TransistorMeasured>empty()));
    Design design = with(bare(), "devices", devices, "amplifier.gainStage.transistor", "N");
    assertThat(DesignValidation.check(design))
        .extracting(Problem::path)
        .containsExactly("amplifier.gainStage.transistor");
  }

  @Test
  void aCheckedDesignKeepsItsPairsPolarity() {
    assertThat(DeviceRoles.pairPolarity(bare())).contains(Polarity.NPN);
    assertThat(DeviceRoles.pairPolarity(SampleDesigns.bareTurnedOver())).contains(Polarity.PNP);
    assertThat(DeviceRoles.pairPolarity(figures())).isEmpty();
  }

  private static Arguments broken(Design design, String path, String says) {
    return Arguments.of(design, new Problem(path, says));
  }

  private static CurrentSource.Mirror tail(String transistor, Optional<FeedFrom> feed) {
    return new CurrentSource.Mirror(transistor, part("10k"), part("0"), feed);
  }

  private static Reading reading(Optional<String> hookup, String quantity, String part) {
    return new Reading(
        hookup,
        quantity,
        quantity("9.05k"),
        Optional.empty(),
        Optional.empty(),
        Optional.of(part),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  private static CurrentSource.Resistor resistor(
      Optional<Quantity> tolerance, Optional<Quantity> measured) {
    return new CurrentSource.Resistor(new PartValue(quantity("12k"), tolerance, measured));
  }

  /** Path and value by turns. */
  private static Design with(Design design, Object... changes) {
    Design changed = design;
    for (int i = 0; i < changes.length; i += 2) {
      changed = DesignPath.set(changed, (String) changes[i], changes[i + 1]);
    }
    return changed;
  }
}
