package loopwright;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;

/** What must hold in a house, each rule with its reason. */
final class HouseRules {
  private static final Set<String> NAMES_WITHOUT_A_SUBJECT =
      Set.of("util", "utils", "misc", "common", "helper", "helpers");

  private final House house;

  HouseRules(House house) {
    this.house = house;
  }

  ArchRule everyPackageIsListed() {
    return classes()
        .should(satisfy("live in a package that the house lists", type -> house.floor(type) >= 0))
        .because("a package without a place in the order grows dependencies both ways");
  }

  ArchRule importsPointUpTheList() {
    return classes()
        .should(importOnlyPackagesBeforeTheirOwn())
        .because("physics is used and tested without files, and all but the view without Swing");
  }

  ArchRule noCycles() {
    return slices()
        .matching(house.root() + ".(**)")
        .should()
        .beFreeOfCycles()
        .because("packages that need each other are one package and cannot be read one by one");
  }

  ArchRule everyPackageHasASubject() {
    return classes()
        .should(
            satisfy(
                "live in a package that is named for its subject",
                type ->
                    List.of(house.path(type).split("\\.")).stream()
                        .noneMatch(NAMES_WITHOUT_A_SUBJECT::contains)))
        .because("what belongs nowhere attracts everything, and cycles grow there");
  }

  ArchRule everyPackageSaysWhatItIsFor() {
    return classes()
        .should(satisfy("live in a package with a package-info.java", house::hasPackageInfo))
        .because("each package states its responsibility and what it may import");
  }

  ArchRule linearAlgebraOnlyInNumeric() {
    return onlyIn(
        "numeric",
        "one wrapper judges singularity and scale; a library's own verdict is not trusted",
        "org.ejml..");
  }

  ArchRule jsonLibraryOnlyInFile() {
    return onlyIn(
        "file",
        "places in messages, double keys and spellings are looked after in one package",
        "com.fasterxml..");
  }

  ArchRule chartLibraryOnlyInViewChart() {
    return onlyIn("view.chart", "our plots outlive the library that draws them", "org.jfree..");
  }

  ArchRule lookAndFeelOnlyInViewTheme() {
    return onlyIn(
        "view.theme", "colours and fonts are decided in one place", "com.formdev.flatlaf..");
  }

  ArchRule commandLineLibraryOnlyInCommand() {
    return onlyIn("command", "everything else is called with values, not with words", "picocli..");
  }

  ArchRule paperLibrariesOnlyInSheet() {
    return onlyIn(
        "sheet",
        "drawings know only a Graphics2D, so that one drawing serves screen, PDF and SVG",
        "org.apache.pdfbox..",
        "org.apache.fontbox..",
        "de.rototor.pdfbox..",
        "org.apache.batik..",
        "org.apache.xmlgraphics..");
  }

  ArchRule formLayoutOnlyInView() {
    return onlyIn("view", "only the window lays out forms", "net.miginfocom..");
  }

  ArchRule swingOnlyInView() {
    return onlyIn(
        "view",
        "everything up to the session runs and is tested without a display",
        "javax.swing..");
  }

  ArchRule graphicsOnlyInSheetAndView() {
    return noClasses()
        .that(house.outside("sheet", "view").and(house.notInRoot()))
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("java.awt..", "javax.imageio..", "javax.print..")
        .because("a prediction needs neither a display nor a font");
  }

  ArchRule standardStreamsOnlyInRoot() {
    return noClasses()
        .that(house.notInRoot())
        .should(ACCESS_STANDARD_STREAMS)
        .orShould()
        .callMethod(System.class, "exit", int.class)
        .because("scripts read results from standard output, and tests capture the streams");
  }

  ArchRule noChangeableStaticField() {
    return fields()
        .that(describe("are written by a person", HouseRules::isWrittenByAPerson))
        .and()
        .areStatic()
        .should()
        .beFinal()
        .because("two designs open at once, and two tests at once, must not see each other");
  }

  private ArchRule onlyIn(String home, String reason, String... libraries) {
    return noClasses()
        .that(house.outside(home))
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(libraries)
        .because(reason);
  }

  /** Compilers and coverage tools add static fields of their own. */
  private static boolean isWrittenByAPerson(JavaField field) {
    return !field.getModifiers().contains(JavaModifier.SYNTHETIC);
  }

  private static ArchCondition<JavaClass> satisfy(String text, Predicate<JavaClass> holds) {
    return new ArchCondition<>(text) {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        if (!holds.test(type)) {
          events.add(SimpleConditionEvent.violated(type, type.getName() + " does not " + text));
        }
      }
    };
  }

  private ArchCondition<JavaClass> importOnlyPackagesBeforeTheirOwn() {
    return new ArchCondition<>("import only packages before their own") {
      @Override
      public void check(JavaClass type, ConditionEvents events) {
        type.getDirectDependenciesFromSelf().stream()
            .filter(dependency -> house.isInTree(dependency.getTargetClass()))
            .filter(dependency -> house.floor(dependency.getTargetClass()) > house.floor(type))
            .forEach(
                dependency ->
                    events.add(
                        SimpleConditionEvent.violated(dependency, dependency.getDescription())));
      }
    };
  }
}
