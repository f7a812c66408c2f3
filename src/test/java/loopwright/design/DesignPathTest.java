package loopwright.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import loopwright.part.TransistorModel;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class DesignPathTest {
  static List<Design> designs() {
    return List.of(
        SampleDesigns.bare(),
        SampleDesigns.full(),
        SampleDesigns.variant(),
        SampleDesigns.figures());
  }

  @ParameterizedTest
  @MethodSource("designs")
  void settingWhatStandsThereChangesNothing(Design design) {
    List<String> paths = DesignPath.all(design);
    assertThat(paths).doesNotHaveDuplicates().hasSizeGreaterThan(80);
    for (String path : paths) {
      Object value = DesignPath.get(design, path);
      assertThat(DesignPath.set(design, path, value)).as(path).isEqualTo(design);
    }
  }

  @ParameterizedTest
  @MethodSource("designs")
  void everyValueCanBeChangedAloneAndIsFoundAgain(Design design) {
    for (String path : DesignPath.all(design)) {
      Object value = DesignPath.get(design, path);
      Object other = another(value, DesignPath.field(design, path));
      if (other == null || path.endsWith(".name")) {
        continue;
      }
      Design changed = DesignPath.set(design, path, other);
      assertThat(DesignPath.get(changed, path)).as(path).isEqualTo(other);
      assertThat(changed).as(path).isNotEqualTo(design);
      assertThat(DesignPath.set(changed, path, value)).as(path).isEqualTo(design);
    }
  }

  private static Object another(Object value, Field field) {
    if (value instanceof Quantity quantity) {
      return new Quantity(quantity.value() / 2, quantity.spelling() + "/2", false);
    }
    return switch (field.shape()) {
      case TEXT -> value + "x";
      case COUNT -> (int) value + 1;
      case FLAG -> !(boolean) value;
      case CHOICE ->
          field.choices().stream()
              .map(word -> field.choice(word).orElseThrow())
              .filter(choice -> !choice.equals(value))
              .findFirst()
              .orElseThrow();
      case PART_VALUE -> PartValue.of(((PartValue) value).value().value() / 2 + 1e-12);
      default -> null;
    };
  }

  /** Otherwise a field that no sample holds would escape the two tests above. */
  @Test
  void theSamplesHoldEveryFieldThatADesignCanHave() {
    Set<String> missing = new TreeSet<>();
    for (Class<?> block : blocks(Schema.of(Design.class), new HashSet<>())) {
      Schema.of(block).fields().forEach(field -> missing.add(name(block, field)));
    }
    assertThat(missing).contains("TransistorModel.flickerCorner", "Design.hookups");
    for (Design design : designs()) {
      remove(missing, design);
      DesignWalk.over(design, (path, field, value) -> remove(missing, value));
    }
    // Alternatives are single values to a path: what they hold has no path of its own.
    assertThat(missing)
        .containsExactly(
            "Drawer$Stock$Series.series",
            "Drawer$Stock$Values.values",
            "Tolerances$BetaSpread$ByFraction.fraction");
  }

  private static void remove(Set<String> missing, Object value) {
    if (value instanceof Record block
        && !(value instanceof Quantity)
        && !(value instanceof Tolerances.BetaSpread)
        && !(value instanceof Drawer.Stock)) {
      Schema schema = Schema.of(block.getClass());
      for (Field field : schema.fields()) {
        Object held = schema.value(block, field.name());
        if (!held.equals(Optional.empty()) && !held.equals(List.of()) && !held.equals(Map.of())) {
          missing.remove(name(schema.type(), field));
        }
      }
    }
  }

  private static String name(Class<?> block, Field field) {
    return block.getName().substring(block.getPackageName().length() + 1) + "." + field.name();
  }

  private static Set<Class<?>> blocks(Schema schema, Set<Class<?>> known) {
    if (known.add(schema.type())) {
      for (Field field : schema.fields()) {
        Field inner = field.element().orElse(field);
        switch (inner.shape()) {
          case BLOCK -> blocks(Schema.of(inner.type()), known);
          case FAMILY, ALTERNATIVES ->
              inner.variants().forEach(variant -> blocks(Schema.of(variant), known));
          default -> {}
        }
      }
    }
    return known;
  }

  @ParameterizedTest
  @CsvSource({
    "amplifier.gainStage.emitterResistance, OHM",
    "amplifier.gainStage.compensation.capacitance, FARAD",
    "hookups.open.load.isolation, OHM",
    "hookups.gain.feedback.leadCapacitance, FARAD",
    "extras.trim.value, OHM",
    "extras.lag.value, FARAD",
    "rails.midRail.upper, OHM",
    "amplifier.gainStage.load.feedResistance, OHM",
    "hookups.open.probes.0.capacitance, FARAD"
  })
  void listsEveryPartByItsPathAndUnit(String path, Unit unit) {
    Design design = SampleDesigns.full();
    assertThat(DesignPath.parts(design))
        .contains(new NamedPart(path, (PartValue) DesignPath.get(design, path), unit));
  }

  @Test
  void leavesWiresOutOfThePartsList() {
    assertThat(DesignPath.parts(SampleDesigns.bare()).stream().map(NamedPart::path))
        .containsExactly(
            "amplifier.inputPair.tail.resistance",
            "amplifier.inputPair.load.output",
            "amplifier.gainStage.load.resistance");
  }

  @Test
  void reachesModelsAndDevicesByTheirNames() {
    Design design = SampleDesigns.full();
    assertThat(DesignPath.get(design, "parts.N.model.forwardBeta"))
        .isEqualTo(SampleDesigns.quantity("200"));
    assertThat(DesignPath.get(design, "devices.pair.q1.part")).isEqualTo("ND");
    assertThat(DesignPath.find(design, "devices.out.upper.part")).isEmpty();
    assertThat(DesignPath.find(SampleDesigns.bare(), "rails.midRail.upper")).isEmpty();
    assertThat(DesignPath.field(SampleDesigns.bare(), "rails.midRail.upper").unit())
        .contains(Unit.OHM);
    assertThat(DesignPath.field(design, "amplifier.inputPair.emitterResistance.measured").unit())
        .contains(Unit.OHM);
  }

  @Test
  void createsAnAbsentBlockWhenNothingElseInItIsNeeded() {
    Design design =
        DesignPath.set(
            SampleDesigns.bare(),
            "amplifier.gainStage.compensation.capacitance",
            SampleDesigns.part("22p"));
    assertThat(DesignPath.get(design, "amplifier.gainStage.compensation.resistance"))
        .isEqualTo(PartValue.of(0));
    Design chosen = DesignPath.set(SampleDesigns.bare(), "devices.pair.q2.part", "ND");
    assertThat(chosen.devices())
        .containsEntry("pair.q2", new DeviceChoice(Optional.of("ND"), Optional.empty()));
  }

  @Test
  void refusesToCreateABlockThatWouldBeIncomplete() {
    assertThatThrownBy(
            () ->
                DesignPath.set(
                    SampleDesigns.bare(),
                    "amplifier.gainStage.compensation.resistance",
                    SampleDesigns.part("330")))
        .isInstanceOf(DesignException.class)
        .hasMessage(
            "amplifier.gainStage.compensation.capacitance: found nothing, expected a capacitance"
                + " in F, such as 22p or 4n7");
  }

  @Test
  void takesOptionalThingsAndElementsAway() {
    Design design = SampleDesigns.full();
    assertThat(DesignPath.set(design, "rails.midRail", null).rails().midRail()).isEmpty();
    assertThat(DesignPath.set(design, "extras.trim", null).extras()).hasSize(1);
    assertThat(DesignPath.set(design, "devices.pair.q1", null).devices()).isEmpty();
    assertThat(
            DesignPath.get(
                DesignPath.set(design, "hookups.open.load.isolation", Optional.empty()),
                "hookups.open.load.isolation"))
        .isEqualTo(PartValue.of(0));
    assertThatThrownBy(() -> DesignPath.set(design, "amplifier.gainStage.transistor", null))
        .hasMessage("amplifier.gainStage.transistor: found nothing, expected a text");
    assertThat(
            DesignPath.set(
                SampleDesigns.bare(), "amplifier.gainStage.compensation.resistance", null))
        .isEqualTo(SampleDesigns.bare());
  }

  @Test
  void addsElements() {
    Design design = SampleDesigns.bare();
    Hookup second = SampleDesigns.hookup("second", SampleDesigns.follower());
    assertThat(DesignPath.set(design, "hookups.second", second).hookups())
        .containsExactly(design.hookups().get(0), second);
    Probe probe = new Probe("out", Optional.empty(), Optional.empty());
    assertThat(
            DesignPath.get(
                DesignPath.set(design, "hookups.follower.probes.0", probe),
                "hookups.follower.probes.0.node"))
        .isEqualTo("out");
    assertThat(DesignPath.set(design, "parts.new", SampleDesigns.diode()).parts())
        .containsKey("new");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "amplifier.gainStage.emiterResistance | amplifier.gainStage.emiterResistance: found no such"
            + " field, expected one of transistor, load, emitterResistance, emitterBypass, buffer,"
            + " compensation",
        "hookups.lower.load.isolation | hookups.lower: found nothing, expected one of gain,"
            + " inverting, open",
        "hookups.open.probes.7.node | hookups.open.probes.7: found nothing, expected one of 0",
        "name.first | name: found a value without fields, expected a text",
        "tail | tail: found no such field, expected one of loopwright, name, notes, rails,"
            + " surroundings, parts, amplifier, devices, extras, hookups, tolerances, limits,"
            + " drawer, bench",
        "parts.X.model.forwardBeta | parts.X: found nothing, expected a block whose kind is one of"
            + " npn, pnp, diode"
      })
  void saysWhatIsThereWhereAPathLeadsNowhere(String path, String message) {
    assertThatThrownBy(() -> DesignPath.get(SampleDesigns.full(), path))
        .isInstanceOf(DesignException.class)
        .hasMessage(message);
  }

  @Test
  void refusesValuesOfAnotherTypeOrRange() {
    Design design = SampleDesigns.full();
    assertThatThrownBy(() -> DesignPath.set(design, "rails.positive", "12"))
        .hasMessage(
            "rails.positive: found a value of another type, expected a voltage in V, such as 12"
                + " or 10mV");
    assertThatThrownBy(
            () ->
                DesignPath.set(
                    design, "amplifier.gainStage.emitterResistance", SampleDesigns.part("-1")))
        .hasMessage(
            "amplifier.gainStage.emitterResistance: found \"-1\", expected a resistance in Ω that"
                + " is zero or more");
    PartValue loose =
        new PartValue(
            SampleDesigns.quantity("47"),
            Optional.of(SampleDesigns.quantity("200%")),
            Optional.empty());
    assertThatThrownBy(() -> DesignPath.set(design, "amplifier.gainStage.emitterResistance", loose))
        .hasMessageStartingWith("amplifier.gainStage.emitterResistance.tolerance: found \"200%\"");
    assertThatThrownBy(() -> DesignPath.set(design, "limits", List.of("x")))
        .hasMessage("limits: found a value of another type, expected a list");
  }

  @Test
  void theSchemaKnowsWhatARecordNeeds() {
    Schema stage = Schema.of(GainStage.class);
    assertThat(stage.needed().stream().map(Field::name)).containsExactly("transistor", "load");
    assertThat(stage.field("load").orElseThrow().shape()).isEqualTo(Shape.FAMILY);
    assertThat(Field.kinds(CurrentSource.TwoTransistor.class)).containsExactly("twoTransistor");
    assertThat(Schema.of(Hookup.class).field("source").orElseThrow().absent())
        .isEqualTo(SampleDesigns.defaults(Source.class));
    assertThat(Schema.of(CurrentSource.Mirror.class).field("feedFrom").orElseThrow().choices())
        .containsExactly("ground", "midRail", "oppositeRail");
    assertThat(Schema.of(TransistorModel.class).needed()).isEmpty();
    assertThat(Schema.of(FiguresAmplifier.class).field("slewRate").orElseThrow().absent())
        .isEqualTo(Quantity.of(Double.POSITIVE_INFINITY));
  }
}
