package loopwright;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.io.IOException;
import java.io.ObjectInputStream;
import java.net.Socket;
import java.net.URL;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** The program's own code opens no connection, and makes no object of a class that a file names. */
class SupplyTest {
  private static final Set<String> CALLS =
      Set.of(
          "java.net.URL.openStream",
          "java.net.URL.openConnection",
          "java.net.URL.getContent",
          "java.lang.Class.forName",
          "java.lang.ClassLoader.loadClass");
  private static final String TYPES =
      "java\\.net\\.(http\\..*|.*Socket|.*URLConnection|InetAddress)"
          + "|java\\.nio\\.channels\\..*Socket.*|javax\\.net\\..*|java\\.rmi\\..*"
          + "|java\\.io\\.Object(Input)Stream|java\\.beans\\.XMLDecoder"
          + "|com\\.fasterxml\\.jackson\\.databind\\.jsontype\\..*";

  private final ArchRule types =
      noClasses().should().dependOnClassesThat().haveNameMatching(TYPES).allowEmptyShould(true);
  private final ArchRule calls =
      noClasses()
          .should()
          .accessTargetWhere(
              describe(
                  "opens a URL or loads a class by its name",
                  (JavaAccess<?> access) ->
                      CALLS.contains(
                          access.getTargetOwner().getName() + "." + access.getTarget().getName())));

  @Test
  void theProgramNeitherConnectsNorLoadsByName() {
    JavaClasses program =
        new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("loopwright");
    assertThat(program.contain(Loopwright.class)).isTrue();
    assertThat(types.evaluate(program).getFailureReport().getDetails()).isEmpty();
    assertThat(calls.evaluate(program).getFailureReport().getDetails()).isEmpty();
  }

  @Test
  void theRulesFindEachBreach() {
    JavaClasses breach = new ClassFileImporter().importClasses(Breach.class);
    assertThat(types.evaluate(breach).getFailureReport().toString())
        .contains("java.net.Socket", "java.io.ObjectInputStream");
    assertThat(calls.evaluate(breach).getFailureReport().toString())
        .contains("openStream", "forName");
  }

  /** Does once what the program never does; is never called. */
  private static final class Breach {
    static Object connect(Socket socket) throws IOException, ClassNotFoundException {
      try (ObjectInputStream stream = new ObjectInputStream(socket.getInputStream())) {
        return stream.readObject();
      }
    }

    static Object load(URL url) throws IOException, ClassNotFoundException {
      url.openStream().close();
      return Class.forName("loopwright.Loopwright");
    }
  }
}
