package loopwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.FrozenDesigns;
import loopwright.file.DesignChecksum;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The sheet on paper, read back with a text stripper. */
class SheetPdfTest {
  private static final String HOSTILE =
      "<script>alert(1)</script> & \"R\u202E\u0007 \uD83D\uDE00 \u6D4B <b>".repeat(12);

  static Stream<Arguments> examplesOnBothPapers() {
    return Stream.of(
            "seismometer-coil",
            "hydrophone-follower",
            "measured-amplifier",
            "nine-volt-preamplifier",
            "everything-fitted")
        .flatMap(name -> Arrays.stream(Paper.values()).map(paper -> Arguments.of(name, paper)));
  }

  @ParameterizedTest
  @MethodSource("examplesOnBothPapers")
  void everythingStandsOnOneOrTwoPages(String example, Paper paper) throws IOException {
    BenchSheet sheet = SampleSheets.of(example);
    PdfText pdf = new PdfText(SheetFile.PDF.bytes(sheet, paper));

    // Every stage of the library in one amplifier, with three hookups, is no usual design.
    assertThat(pdf.pages()).isBetween(1, example.equals("everything-fitted") ? 3 : 2);
    assertThat(pdf.plain()).contains(sheet.title()).contains(sheet.checksum());
    assertThat(pdf.plain()).doesNotContain("?", "\u25A1", "\uFFFD");
    assertThat(sheet.nodes()).isNotEmpty();
    assertThat(sheet.nodes())
        .allSatisfy(
            node ->
                assertThat(pdf.plain())
                    .contains(PartSays.node(node.name()))
                    .contains(node.volts().says())
                    .contains(node.volts().lowSays())
                    .contains(node.volts().highSays()));
    assertThat(sheet.nodes())
        .allSatisfy(
            node ->
                assertThat(pdf.plain().replace(" ", ""))
                    .contains(node.ifHigh().split(";")[0].replace(" ", "")));
    List<String> designators =
        sheet.parts().stream().flatMap(part -> part.designators().stream()).toList();
    assertThat(designators).doesNotHaveDuplicates();
    assertThat(designators)
        .allSatisfy(name -> assertThat(pdf.plain()).containsPattern("\\b" + name + "\\b"));
    assertThat(sheet.cautions()).hasSizeGreaterThan(6);
    String unbroken = pdf.plain().replace(" ", "");
    assertThat(sheet.cautions())
        .allSatisfy(caution -> assertThat(unbroken).contains(caution.replace(" ", "")));
    assertThat(sheet.hookups())
        .allSatisfy(hookup -> assertThat(pdf.plain()).contains("Hookup \u201C" + hookup.name()));
    nothingStandsInTheMargins(pdf, paper);
  }

  private static void nothingStandsInTheMargins(PdfText pdf, Paper paper) {
    assertThat(pdf.places()).hasSizeGreaterThan(1000);
    assertThat(pdf.places())
        .allSatisfy(
            place -> {
              assertThat(place.left()).isGreaterThanOrEqualTo(SheetPdf.MARGIN - 0.1);
              assertThat(place.right()).isLessThanOrEqualTo(paper.width() - SheetPdf.MARGIN + 0.1);
              assertThat(place.base())
                  .isBetween(SheetPdf.MARGIN, paper.height() - SheetPdf.MARGIN + 0.1);
            });
  }

  @Test
  void itSaysWhatItIs() throws IOException {
    BenchSheet sheet = SampleSheets.of("hydrophone-follower");
    PdfText pdf = new PdfText(SheetFile.PDF.bytes(sheet, Paper.A4));

    assertThat(pdf.information().getTitle()).isEqualTo("Hydrophone line follower");
    assertThat(pdf.information().getSubject()).contains("2026-12-01").contains("line");
    assertThat(pdf.information().getKeywords()).contains(DesignChecksum.of(sheet.design()));
    assertThat(pdf.information().getCreationDate().toInstant()).hasToString("2026-12-01T00:00:00Z");
  }

  @Test
  void equalDesignsOfOneDayGiveEqualBytes() {
    BenchSheet first = SampleSheets.make(SampleSheets.design("hydrophone-follower"));
    BenchSheet second = SampleSheets.make(SampleSheets.design("hydrophone-follower"));

    for (SheetFile kind : SheetFile.values()) {
      assertThat(kind.bytes(first, Paper.A4)).isEqualTo(kind.bytes(second, Paper.A4));
      assertThat(kind.bytes(first, Paper.A4)).isNotEqualTo(kind.bytes(first, Paper.LETTER));
    }
  }

  @Test
  void anyNameIsPrinted() throws IOException {
    Design named = DesignPath.set(SampleSheets.design("measured-amplifier"), "name", HOSTILE);
    PdfText pdf = new PdfText(SheetFile.PDF.bytes(SampleSheets.make(named), Paper.LETTER));

    assertThat(pdf.plain()).contains("<script>alert(1)</script>").contains("\u2026");
    assertThat(pdf.plain()).contains("\u25A1");
  }

  @Test
  void aFailedSolveIsSaidAndNeverANumber() throws IOException {
    BenchSheet sheet = SampleSheets.make(FrozenDesigns.absurd(953));
    PdfText pdf = new PdfText(SheetFile.PDF.bytes(sheet, Paper.A4));

    assertThat(sheet.failure()).isPresent();
    assertThat(sheet.nodes()).isEmpty();
    assertThat(sheet.hookups().get(0).shows()).isEmpty();
    assertThat(pdf.plain().replace(" ", ""))
        .contains("findsnooperatingpoint")
        .contains("nothingtakesupthecurrentatnode");
  }

  @Test
  void withoutTolerancesThereIsNoBandAndTheSheetSaysSo() {
    BenchSheet sheet = SampleSheets.of("measured-amplifier");

    assertThat(sheet.bands()).contains("no tolerances");
    assertThat(sheet.nodes())
        .allSatisfy(
            node -> {
              assertThat(node.volts().low()).isEmpty();
              assertThat(node.volts().value().number()).isPresent();
            });
    assertThat(sheet.failure()).isEqualTo(Optional.empty());
  }
}
