package loopwright.view.form;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.ResourceBundle;
import java.util.Set;
import loopwright.design.Feedback;
import loopwright.design.Field;
import loopwright.design.FieldText;
import loopwright.design.FiguresAmplifier;
import loopwright.design.GainStage;
import loopwright.design.InputPair;
import loopwright.design.Load;
import loopwright.design.OutputStage;
import loopwright.design.Rails;
import loopwright.design.Schema;
import loopwright.design.Shape;
import loopwright.design.Source;
import loopwright.design.Surroundings;
import org.junit.jupiter.api.Test;

/** Whatever a form can show has its words, and whatever can be chosen has values to begin with. */
class LabelsTest {
  private final Labels labels = new Labels();

  @Test
  void everyFieldKindAndChoiceHasItsWords() {
    Set<Class<?>> records = records();
    assertThat(records).hasSizeGreaterThan(25);
    for (Class<?> owner : records) {
      for (Field field : Schema.of(owner).fields()) {
        assertThat(labels.field(owner, field.name())).isNotBlank();
        for (Class<?> variant : variants(field)) {
          assertThat(labels.kind(variant)).isNotBlank();
        }
        if (field.shape() == Shape.CHOICE) {
          for (Object constant : field.type().getEnumConstants()) {
            assertThat(labels.choice((Enum<?>) constant)).isNotBlank();
          }
        }
      }
    }
  }

  @Test
  void everyNeededValueHasSomethingToBeginWithAndNothingElseHas() {
    ResourceBundle beginnings = ResourceBundle.getBundle("loopwright.view.form.beginnings");
    Set<String> wanted = new LinkedHashSet<>();
    for (Class<?> begun : begun()) {
      for (Field field : Schema.of(begun).fields()) {
        if (Beginnings.needsValue(field)) {
          String key = Labels.typeName(begun) + "." + field.name();
          wanted.add(key);
          assertThatCode(() -> FieldText.parse(field, beginnings.getString(key), key))
              .doesNotThrowAnyException();
        }
      }
    }
    assertThat(beginnings.keySet()).containsExactlyInAnyOrderElementsOf(wanted);
  }

  @Test
  void everyDeviceRoleHasAName() {
    for (String role :
        List.of(
            "pair.q1",
            "pair.q4",
            "tail.q2",
            "tail.d1",
            "gain.q1",
            "gain.buffer",
            "gainLoad.q1",
            "gainLoad.d2",
            "bias.q1",
            "bias.d1",
            "driver.upper",
            "driver.lower",
            "out.upper",
            "out.lower")) {
      assertThat(labels.device(role)).isNotBlank().doesNotContain("{");
    }
    assertThat(labels.device("pair.q2")).isEqualTo("Q2");
  }

  /** All records that a form may show the fields of. */
  private static Set<Class<?>> records() {
    Set<Class<?>> found = new LinkedHashSet<>();
    for (Class<?> block :
        List.of(
            Source.class,
            InputPair.class,
            GainStage.class,
            FiguresAmplifier.class,
            Load.class,
            Rails.class,
            Surroundings.class)) {
      collect(block, found);
    }
    for (Class<?> family : List.of(OutputStage.class, Feedback.class)) {
      variants(family).forEach(variant -> collect(variant, found));
    }
    return found;
  }

  private static void collect(Class<?> owner, Set<Class<?>> found) {
    if (found.add(owner)) {
      for (Field field : Schema.of(owner).fields()) {
        variants(field).forEach(variant -> collect(variant, found));
        if (field.shape() == Shape.BLOCK) {
          collect(field.type(), found);
        }
      }
    }
  }

  /** The records that a form makes when a person fits or chooses them. */
  private static Set<Class<?>> begun() {
    Set<Class<?>> begun = new LinkedHashSet<>(variants(OutputStage.class));
    begun.addAll(variants(Feedback.class));
    for (Class<?> owner : records()) {
      for (Field field : Schema.of(owner).fields()) {
        begun.addAll(variants(field));
        if (field.shape() == Shape.BLOCK && field.optional()) {
          begun.add(field.type());
        }
      }
    }
    return begun;
  }

  private static List<Class<?>> variants(Field field) {
    return field.shape() == Shape.FAMILY ? field.variants() : List.of();
  }

  private static List<Class<?>> variants(Class<?> family) {
    return List.of(family.getPermittedSubclasses());
  }
}
