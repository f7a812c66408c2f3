package loopwright;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.nio.file.Path;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Holds the program to its house rules, and the rules to a small house in which each of them is
 * broken once, so that a rule that has stopped looking is found out.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class ArchitectureTest {
  /** Far below the real count: it only has to tell a scan that found nothing. */
  private static final int FEWEST_CLASSES = 90;

  private final HouseRules rules =
      new HouseRules(new House("loopwright", Path.of("src/main/java")));
  private final HouseRules plantedRules =
      new HouseRules(new House("planted", Path.of("src/test/java")));
  private JavaClasses program;
  private JavaClasses planted;

  @BeforeAll
  void readClasses() {
    program =
        new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("loopwright");
    planted = new ClassFileImporter().importPackages("planted");
  }

  @Test
  void theScanFindsTheProgram() {
    assertThat(program.size()).isGreaterThan(FEWEST_CLASSES);
    assertThat(program.contain(Loopwright.class)).isTrue();
    assertThat(program.contain(ArchitectureTest.class)).isFalse();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rulesAndTheirPlantedBreach")
  void theProgramKeepsTheRule(String name, Function<HouseRules, ArchRule> rule) {
    assertThat(rule.apply(rules).evaluate(program).getFailureReport().getDetails()).isEmpty();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rulesAndTheirPlantedBreach")
  void theRuleFindsThePlantedBreach(
      String name, Function<HouseRules, ArchRule> rule, String culprit) {
    assertThat(rule.apply(plantedRules).evaluate(planted).getFailureReport().getDetails())
        .isNotEmpty()
        .anySatisfy(detail -> assertThat(detail).contains(culprit));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rulesAndTheirPlantedBreach")
  void theRuleLeavesTheBlamelessAlone(String name, Function<HouseRules, ArchRule> rule) {
    assertThat(rule.apply(plantedRules).evaluate(planted).getFailureReport().getDetails())
        .noneSatisfy(detail -> assertThat(detail).contains("Blameless"));
  }

  static Stream<Arguments> rulesAndTheirPlantedBreach() {
    return Stream.of(
        breach(
            "every package is listed", HouseRules::everyPackageIsListed, "planted.gossip.Unlisted"),
        breach(
            "imports point up the list",
            HouseRules::importsPointUpTheList,
            "planted.quantity.LooksDown"),
        breach("no cycles", HouseRules::noCycles, "planted.circuit.HalfOfACycle"),
        breach(
            "every package has a subject",
            HouseRules::everyPackageHasASubject,
            "planted.design.util.Whatever"),
        breach(
            "every package says what it is for",
            HouseRules::everyPackageSaysWhatItIsFor,
            "planted.design.util.Whatever"),
        breach(
            "linear algebra only in numeric",
            HouseRules::linearAlgebraOnlyInNumeric,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "JSON library only in file",
            HouseRules::jsonLibraryOnlyInFile,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "chart library only in view.chart",
            HouseRules::chartLibraryOnlyInViewChart,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "look and feel only in view.theme",
            HouseRules::lookAndFeelOnlyInViewTheme,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "command-line library only in command",
            HouseRules::commandLineLibraryOnlyInCommand,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "PDF and SVG libraries only in sheet",
            HouseRules::paperLibrariesOnlyInSheet,
            "planted.solve.UsesForeignLibraries"),
        breach(
            "form layout only in view",
            HouseRules::formLayoutOnlyInView,
            "planted.solve.UsesForeignLibraries"),
        breach("Swing only in view", HouseRules::swingOnlyInView, "planted.sheet.PaintsWithSwing"),
        breach(
            "graphics only in sheet and view",
            HouseRules::graphicsOnlyInSheetAndView,
            "planted.circuit.Paints"),
        breach(
            "standard streams only in root",
            HouseRules::standardStreamsOnlyInRoot,
            "planted.circuit.Talks"),
        breach(
            "no exit but in root", HouseRules::standardStreamsOnlyInRoot, "planted.circuit.Exits"),
        breach(
            "no changeable static field",
            HouseRules::noChangeableStaticField,
            "planted.circuit.Remembers"));
  }

  private static Arguments breach(
      String name, Function<HouseRules, ArchRule> rule, String culprit) {
    return arguments(name, rule, culprit);
  }
}
