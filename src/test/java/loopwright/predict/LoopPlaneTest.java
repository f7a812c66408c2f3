package loopwright.predict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.stream.Collectors;
import loopwright.design.Design;
import loopwright.design.Hookup;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;

/**
 * The loop gain turns about −1 as often as roots grow: Nyquist, Bell System Technical Journal 11,
 * 1932, 126–147, for amplifiers that are stable with the loop open.
 */
class LoopPlaneTest {
  private static LoopPlane plane(String example) {
    Design design =
        new DesignFile(
                new ShelfFile().shipped(),
                Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
            .read(Path.of("examples", example + ".json"))
            .design();
    Hookup hookup = design.hookups().get(0);
    return LoopPlane.of(design, hookup, Progress.none());
  }

  @Test
  void whatOscillatesOverTheSwingTurnsAboutMinusOneAtItsWorstLevel() {
    LoopPlane plane = plane("hydrophone-follower");
    LoopPlane.Turning worst = plane.worst().orElseThrow();
    assertThat(worst.growing()).isEqualTo(2);
    assertThat(worst.clockwise()).isEqualTo(2);
    assertThat(worst.says()).isEqualTo("turns about −1 twice clockwise: 2 roots grow");
    SwingLevel fastest =
        plane.levels().stream()
            .filter(level -> level.growth().isPresent())
            .max((a, b) -> Double.compare(a.growth().getAsDouble(), b.growth().getAsDouble()))
            .orElseThrow();
    assertThat(worst.output()).isEqualTo(fastest.output());
    double reach =
        plane.loci().stream()
            .flatMap(locus -> locus.roots().stream())
            .filter(root -> root.im() > 0)
            .mapToDouble(Root::re)
            .max()
            .orElseThrow();
    assertThat(reach).isCloseTo(fastest.growth().getAsDouble(), within(1e-6 * Math.abs(reach)));
  }

  @Test
  void whatIsStableDoesNotTurn() {
    LoopPlane plane = plane("seismometer-coil");
    assertThat(plane.rest().orElseThrow().clockwise()).isZero();
    assertThat(plane.worst().orElseThrow().says())
        .isEqualTo("does not turn about −1: nothing grows");
    assertThat(plane.rest().orElseThrow().points()).hasSizeGreaterThan(50);
  }

  @Test
  void aRootIsFollowedFromTheFirstLevelToTheLast() {
    LoopPlane plane = plane("seismometer-coil");
    long whole =
        plane.loci().stream()
            .filter(locus -> locus.roots().size() == plane.levels().size())
            .count();
    assertThat(whole).isGreaterThan(5);
  }
}
