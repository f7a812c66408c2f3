package loopwright;

import static com.tngtech.archunit.base.DescribedPredicate.describe;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * A tree of packages that is built like the program's own: which package stands where.
 *
 * @param root the root package
 * @param sources folder that the root package's sources lie in
 */
record House(String root, Path sources) {
  /** Data flows down this list once: each package imports only those that stand before it. */
  static final List<String> PACKAGES =
      List.of(
          "quantity",
          "task",
          "part",
          "design",
          "numeric",
          "circuit",
          "characterise",
          "assembly",
          "solve",
          "predict",
          "spread",
          "bench",
          "sizing",
          "check",
          "propose",
          "file",
          "sheet",
          "session",
          "command",
          "view");

  /** Place in the order, the root package last; −1 for a package that is not listed. */
  int floor(JavaClass type) {
    if (isRoot(type)) {
      return PACKAGES.size();
    }
    return isInTree(type) ? PACKAGES.indexOf(path(type).split("\\.")[0]) : -1;
  }

  boolean isInTree(JavaClass type) {
    return isRoot(type) || type.getPackageName().startsWith(root + ".");
  }

  boolean isRoot(JavaClass type) {
    return type.getPackageName().equals(root);
  }

  /** Package below the root, such as {@code view.chart}; empty for the root itself. */
  String path(JavaClass type) {
    return isRoot(type) ? "" : type.getPackageName().substring(root.length() + 1);
  }

  /** Classes that live outside all of these packages, the packages below them included. */
  DescribedPredicate<JavaClass> outside(String... homes) {
    return describe(
        "live outside " + String.join(", ", homes),
        type ->
            List.of(homes).stream()
                .noneMatch(home -> (path(type) + ".").startsWith(home + ".") && !isRoot(type)));
  }

  DescribedPredicate<JavaClass> notInRoot() {
    return describe("live below the root package", type -> !isRoot(type));
  }

  boolean hasPackageInfo(JavaClass type) {
    return Files.isRegularFile(
        sources.resolve(type.getPackageName().replace('.', '/')).resolve("package-info.java"));
  }
}
