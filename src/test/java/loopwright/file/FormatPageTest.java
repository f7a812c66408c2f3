package loopwright.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.Set;
import java.util.TreeSet;
import loopwright.design.Design;
import loopwright.design.Field;
import loopwright.design.Schema;
import org.junit.jupiter.api.Test;

/** The page of the format knows every field and every kind. */
class FormatPageTest {
  @Test
  void everyFieldAndKindIsOnThePage() throws IOException {
    String page = Files.readString(Path.of("docs/design-file.md"));
    Set<String> words = new TreeSet<>();
    collect(Design.class, new LinkedHashSet<>(), words);
    assertThat(words).hasSizeGreaterThan(120);
    assertThat(words).allSatisfy(word -> assertThat(page).contains(word));
  }

  private static void collect(Class<?> type, Set<Class<?>> seen, Set<String> words) {
    if (!seen.add(type)) {
      return;
    }
    if (type.isSealed()) {
      for (Class<?> variant : type.getPermittedSubclasses()) {
        words.addAll(Field.kinds(variant));
        collect(variant, seen, words);
      }
    } else if (type.isRecord() && type.getPackageName().startsWith("loopwright")) {
      if (type.getPackageName().endsWith("quantity")) {
        return;
      }
      for (Field field : Schema.of(type).fields()) {
        words.add(field.name());
        collect(field.element().orElse(field).type(), seen, words);
      }
    }
  }
}
