package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class JsonReaderTest {
  @Test
  void keepsOrderSpellingAndPlace() {
    Json.Block block =
        (Json.Block) JsonReader.read("{\"b\": 4.70e3,\n  \"a\": [\"4k7\", true, null]}", "x.json");

    assertThat(block.members()).extracting(Json.Member::name).containsExactly("b", "a");
    assertThat(block.get("b")).contains(new Json.Number("4.70e3", new Position(1, 7)));
    Json.Items items = (Json.Items) block.get("a").orElseThrow();
    assertThat(items.position()).isEqualTo(new Position(2, 8));
    assertThat(items.items())
        .containsExactly(
            new Json.Text("4k7", "\"4k7\"", new Position(2, 9)),
            new Json.Truth(true, new Position(2, 16)),
            new Json.Null(new Position(2, 22)));
  }

  @Test
  void keepsEscapesAsTheyWereWritten() {
    Json.Block block =
        (Json.Block)
            JsonReader.read("{\"na\\u006de\": \"4.7 k\\u03a9 \\\"x\\\\\", \"µ\": \"Ω\"}", "x.json");

    Json.Member member = block.members().get(0);
    assertThat(member.name()).isEqualTo("name");
    assertThat(member.literal()).isEqualTo("\"na\\u006de\"");
    Json.Text text = (Json.Text) member.value();
    assertThat(text.value()).isEqualTo("4.7 kΩ \"x\\");
    assertThat(text.literal()).isEqualTo("\"4.7 k\\u03a9 \\\"x\\\\\"");
    assertThat(block.text("µ")).contains("Ω");
  }

  @Test
  void keepsLiteralsInTextsLargerThanAnyBuffer() {
    StringBuilder text = new StringBuilder("[");
    for (int i = 0; i < 20_000; i++) {
      text.append(i == 0 ? "" : ",\n ").append("{\"k\\u0065y\": \"v\\n").append(i).append("\"}");
    }
    Json.Items items = (Json.Items) JsonReader.read(text.append("]").toString(), "x.json");

    assertThat(items.items()).hasSize(20_000);
    for (int i = 0; i < 20_000; i++) {
      Json.Member member = ((Json.Block) items.items().get(i)).members().get(0);
      assertThat(member.literal()).isEqualTo("\"k\\u0065y\"");
      assertThat(((Json.Text) member.value()).literal()).isEqualTo("\"v\\n" + i + "\"");
      assertThat(member.value().position().line()).isEqualTo(i + 1);
    }
  }

  @Test
  void namesThePlaceOfADoubleKey() {
    String text =
        "{\"amplifier\": {\"gainStage\": {\n  \"load\": 1,\n  \"transistor\": 2,\n  \"load\": 3}}}";

    assertThatThrownBy(() -> JsonReader.read(text, "x.json"))
        .isInstanceOf(FileException.class)
        .hasMessage(
            "x.json, line 4, column 3: amplifier.gainStage: the key \"load\" is given twice");
  }

  @Test
  void namesAnEntryOfAListByItsName() {
    String text = "{\"hookups\": [{\"name\": \"main\"}, {\"name\": \"slow\", \"a\": 1, \"a\": 2}]}";

    assertThatThrownBy(() -> JsonReader.read(text, "x.json"))
        .hasMessageContaining(": hookups.slow: the key \"a\" is given twice");
    assertThatThrownBy(() -> JsonReader.read("{\"poles\": [1, {\"a\": 1, \"a\": 2}]}", "x.json"))
        .hasMessageContaining(": poles.1: the key \"a\" is given twice");
  }

  @Test
  void refusesNestingThatNoDesignHas() {
    String deep = "[".repeat(100_000) + "]".repeat(100_000);

    assertThatThrownBy(() -> JsonReader.read(deep, "x.json"))
        .isInstanceOf(FileException.class)
        .hasMessage(
            "x.json, line 1, column 65: found brackets more than 64 deep, expected a design");
    assertThat(JsonReader.read("[".repeat(64) + "]".repeat(64), "x.json")).isNotNull();
  }

  @Test
  void refusesANumberThatIsTooLongToBeMeant() {
    assertThatThrownBy(() -> JsonReader.read("{\"a\": [" + "7".repeat(1000) + "]}", "x.json"))
        .isInstanceOf(FileException.class)
        .hasMessage("x.json: found a number or text in a that is too long to be meant");
  }

  @ParameterizedTest
  @MethodSource
  void saysWhatIsNoJson(String text, String message) {
    assertThatThrownBy(() -> JsonReader.read(text, "x.json"))
        .isInstanceOf(FileException.class)
        .hasMessage("x.json" + message);
  }

  static Stream<Arguments> saysWhatIsNoJson() {
    String number = ", expected a plain number, or text in double quotes such as \"4k7\"";
    String bracket = ", expected a value, or the bracket that is open, and no comma before it";
    String comma = ", expected a comma or a colon before it";
    return Stream.of(
        Arguments.of("", ": found an empty file, expected a JSON text"),
        Arguments.of(" \n ", ": found an empty file, expected a JSON text"),
        Arguments.of("{\"a\": 4k7}", ", line 1, column 7: found 4k7" + number),
        Arguments.of("{\"a\": 04}", ", line 1, column 7: found 04" + number),
        Arguments.of("{\"a\": +1}", ", line 1, column 7: found +1" + number),
        Arguments.of("{\"a\": .5}", ", line 1, column 7: found .5" + number),
        Arguments.of("{\"a\": NaN}", ", line 1, column 7: found NaN" + number),
        Arguments.of("{\"a\": tru}", ", line 1, column 7: found tru" + number),
        Arguments.of("{a: 1}", ", line 1, column 2: found a" + number),
        Arguments.of("Dear friend", ", line 1, column 1: found Dear" + number),
        Arguments.of("{\"a\": 1,}", ", line 1, column 9: found }" + bracket),
        Arguments.of("[1,2,]", ", line 1, column 6: found ]" + bracket),
        Arguments.of("{\"a\": [1,2}", ", line 1, column 11: found } in a" + bracket),
        Arguments.of("{\"a\": 1}}", ", line 1, column 9: found }" + bracket),
        Arguments.of("{\"a\": 1\n \"b\": 2}", ", line 2, column 2: found \"" + comma),
        Arguments.of("{\"a\" \"b\"}", ", line 1, column 6: found \"" + comma),
        Arguments.of(
            "{'a': 1}", ", line 1, column 2: found 'a', expected double quotes around a text"),
        Arguments.of(
            "{\"a\": \"x\ny\"}",
            ", line 1, column 9: found a line break inside a text in a, expected a closing quote"
                + " before it"),
        Arguments.of(
            "{\"a\": \"x\\q\"}",
            ", line 1, column 8: found x\\q in a, expected after a backslash in a text one of"
                + " \" \\ / b f n r t, or u and four digits"),
        Arguments.of(
            "// c\n{}",
            ", line 1, column 1: found //, expected a value (a file has no comments; the field"
                + " notes is for them)"),
        Arguments.of(
            "{} {}",
            ", line 1, column 4: found more text behind the end, expected" + " nothing there"),
        Arguments.of("{", ": the text breaks off, expected the rest of it"),
        Arguments.of("{\"a\"", ": the text breaks off, expected the rest of it"),
        Arguments.of("{\"a\": \"xx", ": the text breaks off in a, expected the rest of it"),
        Arguments.of("{\"a\": {\"b\": 12", ": the text breaks off in a, expected the rest of it"),
        Arguments.of("{\"a\": tr", ": the text breaks off, expected the rest of it"),
        Arguments.of("[1, ", ": the text breaks off, expected the rest of it"),
        Arguments.of("{\"a\": \"\\u12", ": the text breaks off in a, expected the rest of it"));
  }
}
