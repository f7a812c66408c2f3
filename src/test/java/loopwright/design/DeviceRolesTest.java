package loopwright.design;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.Shelf;
import org.junit.jupiter.api.Test;

class DeviceRolesTest {
  @Test
  void namesEveryDeviceWithThePolarityOfItsPlace() {
    assertThat(said(SampleDesigns.full()))
        .containsExactly(
            "pair.q1 ND NPN",
            "pair.q2 N NPN",
            "pair.q3 P PNP",
            "pair.q4 P PNP",
            "tail.q1 N NPN",
            "tail.q2 N NPN",
            "gain.buffer P PNP",
            "gain.q1 P PNP",
            "gainLoad.q1 N NPN",
            "gainLoad.d1 D diode",
            "gainLoad.d2 D diode",
            "bias.q1 N NPN",
            "driver.upper N NPN",
            "driver.lower P PNP",
            "out.upper N NPN",
            "out.lower P PNP");
  }

  @Test
  void turnsAllButTheOutputOverWithThePair() {
    Design design =
        DesignPath.set(
            SampleDesigns.bareTurnedOver(), "amplifier.outputStage.bias", new Bias.Diodes("D", 2));
    assertThat(said(design))
        .containsExactly(
            "pair.q1 P PNP",
            "pair.q2 P PNP",
            "gain.q1 N NPN",
            "bias.d1 D diode",
            "bias.d2 D diode",
            "out.upper N NPN",
            "out.lower P PNP");
  }

  @Test
  void knowsNoDevicesOfAnAmplifierByFigures() {
    assertThat(DeviceRoles.of(SampleDesigns.figures())).isEmpty();
    Design none =
        DesignPath.set(SampleDesigns.bare(), "amplifier.outputStage", new OutputStage.None());
    assertThat(said(none)).containsExactly("pair.q1 N NPN", "pair.q2 N NPN", "gain.q1 P PNP");
  }

  @Test
  void leavesPolarityOpenWhileThePairsPartIsUnknown() {
    Design design = DesignPath.set(SampleDesigns.bare(), "amplifier.inputPair.transistor", "X");
    assertThat(DeviceRoles.find(design, "gain.q1").orElseThrow().polarity()).isEmpty();
    assertThat(DeviceRoles.find(design, "out.upper").orElseThrow().polarity())
        .contains(Polarity.NPN);
  }

  @Test
  void carriesTheReadingsOfASingleDevice() {
    DeviceRole first = DeviceRoles.find(SampleDesigns.full(), "pair.q1").orElseThrow();
    assertThat(first.measured()).contains(SampleDesigns.measured());
    assertThat(first.partPath()).isEqualTo("devices.pair.q1.part");
    assertThat(DeviceRoles.find(SampleDesigns.full(), "pair.q2").orElseThrow().measured())
        .isEmpty();
  }

  @Test
  void listsEveryUseOfAPart() {
    assertThat(UsedParts.of(SampleDesigns.full()).keySet())
        .containsExactlyInAnyOrder("N", "P", "D", "ND");
    assertThat(UsedParts.of(SampleDesigns.full()))
        .containsEntry("ND", List.of("devices.pair.q1.part"))
        .containsEntry("D", List.of("amplifier.gainStage.load.diode"))
        .containsEntry(
            "P",
            List.of(
                "amplifier.inputPair.load.transistor",
                "amplifier.gainStage.buffer.transistor",
                "amplifier.gainStage.transistor",
                "amplifier.outputStage.drivers.lower",
                "amplifier.outputStage.lower",
                "drawer.transistors.1"));
  }

  @Test
  void bringsMissingRecordsInFromTheShelf() {
    PartRecord other = SampleDesigns.datasheetDiode();
    Shelf shelf =
        new Shelf() {
          @Override
          public Optional<PartRecord> find(String name) {
            return name.equals("Z") ? Optional.empty() : Optional.of(other);
          }

          @Override
          public List<String> names() {
            return List.of();
          }
        };
    Design design =
        DesignPath.set(
            DesignPath.set(
                SampleDesigns.bare(), "amplifier.outputStage.bias", new Bias.Diodes("X", 2)),
            "devices.out.upper.part",
            "Z");
    Design whole = UsedParts.withPartsFrom(design, shelf);
    assertThat(whole.parts()).containsEntry("X", other).doesNotContainKey("Z");
    assertThat(whole.parts().get("N")).isEqualTo(SampleDesigns.bare().parts().get("N"));
    assertThat(whole.parts().get("D")).isInstanceOf(DiodeRecord.class).isNotEqualTo(other);
    assertThat(UsedParts.withPartsFrom(whole, Shelf.empty())).isSameAs(whole);
  }

  private static List<String> said(Design design) {
    return DeviceRoles.of(design).stream()
        .map(
            device ->
                device.role()
                    + " "
                    + device.part()
                    + " "
                    + (device.diode() ? "diode" : device.polarity().orElseThrow()))
        .collect(Collectors.toList());
  }
}
