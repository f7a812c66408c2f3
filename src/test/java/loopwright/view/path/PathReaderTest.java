package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.Optional;
import loopwright.design.Amplifier;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.path.SignalPath.Way;
import loopwright.view.path.SignalPath.Wire;
import org.junit.jupiter.api.Test;

/** Every kind of amplifier and hookup, in words. */
class PathReaderTest {
  private static SignalPath solved(Amplifier amplifier, Hookup hookup) {
    Design design = SampleDesigns.design(amplifier, hookup);
    return PathReader.read(design, hookup, Optional.of(SamplePredictions.stable(hookup)));
  }

  private static Block block(SignalPath path, String id) {
    return path.find(id).orElseThrow();
  }

  @Test
  void stagesStandInTheOrderOfTheSignal() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    assertThat(path.row())
        .extracting(Block::id)
        .containsExactly(
            "source",
            "amplifier.inputPair",
            "amplifier.gainStage",
            "amplifier.outputStage",
            "load");
    assertThat(path.hanging().get("amplifier.inputPair").id())
        .isEqualTo("amplifier.inputPair.tail");
    assertThat(path.hanging().get("amplifier.gainStage").id())
        .isEqualTo("amplifier.gainStage.load");
    assertThat(path.feedback().id()).isEqualTo("feedback");
  }

  @Test
  void wiresCarryNodesAndTheirRestVoltages() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    assertThat(path.wires())
        .containsExactly(
            new Wire("in+", "−1.1 mV"),
            new Wire("pairOut", "11.2 V"),
            new Wire("gainOut", "503 mV"),
            new Wire("out", "5.7 mV"));
    assertThat(path.otherInput()).isEqualTo(new Wire("in−", "5.7 mV"));
  }

  @Test
  void anNpnAmplifierInWords() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    assertThat(block(path, "source").description()).isEqualTo("600 Ω; 200 mV peak, 1 kHz");
    assertThat(block(path, "amplifier.inputPair").description())
        .isEqualTo("npn QN; 1.5 kΩ load; 490 µA | 630 µA");
    assertThat(block(path, "amplifier.gainStage").description())
        .isEqualTo("pnp QP; 33 pF Miller; 100 Ω emitter; 1.52 mA");
    assertThat(block(path, "amplifier.outputStage").description())
        .isEqualTo("QN/QP; bases joined; dead zone ±540 mV; cut off at rest");
    assertThat(block(path, "load").description()).isEqualTo("10 kΩ, 100 pF");
    assertThat(path.feedback().says()).containsExactly("10 kΩ over 1 kΩ: 1/11 comes back");
  }

  @Test
  void currentSourcesSayWhatTheyCarryAndWhereTo() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.divider(0.2));
    Block tail = block(path, "amplifier.inputPair.tail");
    // (0.49 + 0.63) mA of collector current and a 200th of it of base current
    assertThat(tail.description()).isEqualTo("mirror QN to −12 V; set by 10 kΩ; 1.13 mA");
    assertThat(tail.kind()).isEqualTo(Block.Kind.CURRENT_SINK);
    Block load = block(path, "amplifier.gainStage.load");
    // (0.503 V + 12 V) across 8.2 kΩ
    assertThat(load.description()).isEqualTo("8.2 kΩ to −12 V; 1.52 mA");
    assertThat(load.kind()).isEqualTo(Block.Kind.RESISTOR);
  }

  @Test
  void aPnpAmplifierIsFedFromThePositiveRail() {
    SignalPath path = solved(SampleDesigns.pnp(), SampleDesigns.divider(0.2));
    assertThat(block(path, "amplifier.inputPair").description())
        .startsWith("pnp QP; mirror QN, 100 Ω; 220 Ω emitters; 47 Ω bases");
    assertThat(block(path, "amplifier.gainStage").description())
        .startsWith(
            "npn QN; buffer QN, 4.7 kΩ; 100 pF + 220 Ω Miller; 47 Ω emitter; 100 µF bypass");
    assertThat(block(path, "amplifier.outputStage").description())
        .startsWith("QN/QP, 22 Ω; VBE multiplier; QN; 2.2 kΩ over 1 kΩ; drivers over 470 Ω; QN/QP");
    Block tail = block(path, "amplifier.inputPair.tail");
    assertThat(tail.says()).containsExactly("two QP from +12 V", "fed by 22 kΩ, 560 Ω");
    assertThat(tail.kind()).isEqualTo(Block.Kind.CURRENT_SOURCE);
    assertThat(block(path, "amplifier.gainStage.load").says())
        .containsExactly("QP on 2 diodes from +12 V", "D, 22 kΩ, 330 Ω");
  }

  @Test
  void withoutAFollowerItsPlaceStaysToBeFilled() {
    SignalPath path = solved(SampleDesigns.withoutFollower(), SampleDesigns.divider(0.2));
    Block absent = block(path, "amplifier.outputStage");
    assertThat(absent.kind()).isEqualTo(Block.Kind.ABSENT);
    assertThat(absent.title()).isEqualTo("No follower");
    assertThat(absent.says()).containsExactly("out is gainOut");
  }

  @Test
  void anAmplifierKnownByFiguresIsOneBlock() {
    SignalPath path = solved(SampleDesigns.figures(), SampleDesigns.divider(0.2));
    assertThat(path.row()).extracting(Block::id).containsExactly("source", "amplifier", "load");
    assertThat(path.hanging()).isEmpty();
    assertThat(path.wires()).extracting(Wire::node).containsExactly("in+", "out");
    assertThat(block(path, "amplifier").description())
        .isEqualTo("offset 6.1 mV; dead zone ±600 mV; poles 50 kHz, 5 MHz; gain 500");
  }

  @Test
  void anInvertingHookupDrivesTheOtherInput() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.inverting(0.1));
    assertThat(path.route().way()).isEqualTo(Way.INVERTING);
    assertThat(path.wires().get(0)).isEqualTo(new Wire("in−", "5.7 mV"));
    assertThat(path.otherInput()).isEqualTo(new Wire("in+", "−1.1 mV"));
    assertThat(path.feedback().says())
        .containsExactly("100 kΩ against 10 kΩ: ideally × −10, in+ to ground through 9.1 kΩ");
  }

  @Test
  void anOpenHookupHasNoWayBack() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.open(1));
    assertThat(path.route().way()).isEqualTo(Way.OPEN);
    assertThat(path.feedback().says())
        .containsExactly("open: nothing comes back, in− to ground through 600 Ω");
    assertThat(block(path, "source").description())
        .isEqualTo("600 Ω; 99.9 kΩ over 100 Ω; attenuates 1/1000; 1 V peak, 1 kHz");
    assertThat(block(path, "load").description()).isEqualTo("nothing connected");
  }

  @Test
  void aWireFromBehindTheIsolation() {
    SignalPath path = solved(SampleDesigns.npn(), SampleDesigns.followerFromLoad(1));
    assertThat(path.route().fromLoad()).isTrue();
    assertThat(path.feedback().says()).containsExactly("wire: all of load comes back");
    assertThat(block(path, "load").description())
        .isEqualTo("10 kΩ, 100 pF; behind 47 Ω; load 5.7 mV");
  }

  @Test
  void withoutAPredictionThereAreNoNumbersOfIt() {
    Hookup hookup = SampleDesigns.divider(0.2);
    Design design = SampleDesigns.design(SampleDesigns.npn(), hookup);
    SignalPath path = PathReader.read(design, hookup, Optional.empty());
    assertThat(path.wires()).extracting(Wire::volts).containsOnly("");
    assertThat(block(path, "amplifier.gainStage").description())
        .isEqualTo("pnp QP; 33 pF Miller; 100 Ω emitter");
    assertThat(block(path, "amplifier.inputPair.tail").description())
        .isEqualTo("mirror QN to −12 V; set by 10 kΩ");
    SignalPath failed =
        PathReader.read(design, hookup, Optional.of(SamplePredictions.failed(hookup)));
    assertThat(failed.wires()).extracting(Wire::volts).containsOnly("");
  }

  @Test
  void aTypeThatTheDesignDoesNotCarryIsNamedWithoutItsPolarity() {
    Hookup hookup = SampleDesigns.divider(0.2);
    Design known = SampleDesigns.design(SampleDesigns.npn(), hookup);
    Design unknown =
        new Design(
            known.loopwright(),
            known.name(),
            known.notes(),
            known.rails(),
            known.surroundings(),
            Map.of(),
            known.amplifier(),
            known.devices(),
            known.extras(),
            known.hookups(),
            known.tolerances(),
            known.limits(),
            known.drawer(),
            known.bench());
    SignalPath path =
        PathReader.read(unknown, hookup, Optional.of(SamplePredictions.stable(hookup)));
    assertThat(block(path, "amplifier.inputPair").says().get(0)).isEqualTo("QN");
    assertThat(block(path, "amplifier.gainStage.load").description()).isEqualTo("8.2 kΩ");
  }
}
