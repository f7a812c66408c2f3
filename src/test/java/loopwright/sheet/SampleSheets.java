package loopwright.sheet;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.spread.Sampling;
import loopwright.task.Progress;

/** Sheets of the shipped examples, made once with few builds, since it is paper that is tested. */
final class SampleSheets {
  static final LocalDate DAY = LocalDate.of(2026, 12, 1);

  private static final Map<String, BenchSheet> MADE = new ConcurrentHashMap<>();

  private SampleSheets() {}

  static Design design(String example) {
    return new DesignFile(
            new ShelfFile().shipped(),
            Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
        .read(Path.of("examples", example + ".json"))
        .design();
  }

  static BenchSheet of(String example) {
    return MADE.computeIfAbsent(example, name -> make(design(name)));
  }

  static BenchSheet make(Design design) {
    return new SheetMaker(DAY, new Sampling(24, 0, 1))
        .make(design, design.hookups().get(0).name(), Progress.none());
  }
}
