package loopwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.DeviceRole;
import loopwright.design.DeviceRoles;
import loopwright.design.FrozenDesigns;
import loopwright.design.NamedPart;
import org.junit.jupiter.api.Test;

/** Every part has a designator of its own, which stays. */
class DesignatorsTest {
  /** Letters of IEEE 315: C capacitor, D diode, Q transistor, R resistor. */
  @Test
  void everyPartHasItsOwn() {
    for (long seed = 1; seed <= 40; seed++) {
      Design design = FrozenDesigns.plausible(seed);
      Designators designators = Designators.of(design);
      List<String> all = new ArrayList<>();
      for (DeviceRole role : DeviceRoles.of(design)) {
        assertThat(designators.of(role.role())).as(role.role()).hasSize(1);
        assertThat(designators.of(role.role()).get(0)).matches(role.diode() ? "D\\d+" : "Q\\d+");
        all.addAll(designators.of(role.role()));
      }
      for (NamedPart part : DesignPath.parts(design)) {
        all.addAll(designators.of(part.path()));
        if (DesignatorPlaces.isPart(part.path())) {
          assertThat(designators.of(part.path())).as(part.path()).isNotEmpty();
        }
      }
      assertThat(all).doesNotHaveDuplicates();
      assertThat(all).noneMatch(name -> name.length() == 4 && name.charAt(1) == '9');
    }
  }

  @Test
  void twinsHaveTwo() {
    Designators designators = Designators.of(SampleSheets.design("seismometer-coil"));

    assertThat(designators.of("amplifier.inputPair.emitterResistance")).containsExactly("R5", "R6");
    assertThat(designators.element("amplifier.inputPair.emitterResistance@pair.q2"))
        .isEqualTo("R6");
    assertThat(designators.of("pair.q1")).containsExactly("Q1");
    assertThat(designators.of("no such path")).isEmpty();
  }

  @Test
  void aPartThatGoesLeavesTheOthersTheirs() {
    Design design = SampleSheets.design("seismometer-coil");
    Design without = DesignPath.set(design, "amplifier.gainStage.compensation", Optional.empty());
    Designators before = Designators.of(design);
    Designators after = Designators.of(without);

    assertThat(before.of("amplifier.gainStage.compensation.capacitance")).hasSize(1);
    assertThat(after.of("amplifier.gainStage.compensation.capacitance")).isEmpty();
    for (NamedPart part : DesignPath.parts(without)) {
      assertThat(after.of(part.path())).as(part.path()).isEqualTo(before.of(part.path()));
    }
  }
}
