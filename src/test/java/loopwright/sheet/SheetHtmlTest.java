package loopwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** The sheet as HTML, read back with an XML parser. */
class SheetHtmlTest {
  private static final String HOSTILE = "</title><script>alert('x')</script> & \"a\" \u0007<img/>";

  private static Document parse(BenchSheet sheet, Paper paper) throws Exception {
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    return factory
        .newDocumentBuilder()
        .parse(new ByteArrayInputStream(SheetFile.HTML.bytes(sheet, paper)));
  }

  private static List<Element> elements(Document document, String tag) {
    NodeList found = document.getElementsByTagName(tag);
    List<Element> elements = new ArrayList<>();
    for (int i = 0; i < found.getLength(); i++) {
      elements.add((Element) found.item(i));
    }
    return elements;
  }

  @ParameterizedTest
  @ValueSource(strings = {"seismometer-coil", "measured-amplifier", "nine-volt-preamplifier"})
  void itIsWellFormedAndWhole(String example) throws Exception {
    BenchSheet sheet = SampleSheets.of(example);
    Document document = parse(sheet, Paper.LETTER);
    String text = document.getDocumentElement().getTextContent();

    assertThat(text).contains("size: Letter").contains(sheet.checksum());
    assertThat(sheet.cautions()).allSatisfy(caution -> assertThat(text).contains(caution));
    assertThat(sheet.nodes())
        .allSatisfy(
            node ->
                assertThat(text)
                    .contains(PartSays.node(node.name()))
                    .contains(node.volts().says()));
    assertThat(elements(document, "svg"))
        .hasSizeGreaterThanOrEqualTo(sheet.pinouts().size())
        .allSatisfy(picture -> assertThat(picture.getAttribute("aria-label")).isNotBlank());
  }

  @Test
  void everyHeadOfATableSaysWhatItHeads() throws Exception {
    Document document = parse(SampleSheets.of("seismometer-coil"), Paper.A4);

    assertThat(elements(document, "table")).hasSizeGreaterThan(3);
    assertThat(elements(document, "caption")).hasSameSizeAs(elements(document, "table"));
    assertThat(elements(document, "th"))
        .hasSizeGreaterThan(20)
        .allSatisfy(head -> assertThat(head.getAttribute("scope")).isIn("col", "row"));
  }

  @Test
  void namesAreTextWhateverStandsInThem() throws Exception {
    Design named = DesignPath.set(SampleSheets.design("measured-amplifier"), "name", HOSTILE);
    BenchSheet sheet = SampleSheets.make(named);
    Document document = parse(sheet, Paper.A4);

    assertThat(elements(document, "script")).isEmpty();
    assertThat(elements(document, "img")).isEmpty();
    assertThat(elements(document, "h1").get(0).getTextContent())
        .isEqualTo(HOSTILE.replace('\u0007', '\uFFFD'));
  }

  @Test
  void itNeedsNothingFromElsewhere() {
    String html =
        new String(
            SheetFile.HTML.bytes(SampleSheets.of("seismometer-coil"), Paper.A4),
            StandardCharsets.UTF_8);

    assertThat(html).doesNotContain("<link").doesNotContain("src=").doesNotContain("@import");
    assertThat(html.replaceAll("url\\(data:[^)]*\\)", "").replaceAll("url\\(#[^)]*\\)", ""))
        .doesNotContain("url(");
  }
}
