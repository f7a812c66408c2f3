package loopwright.view.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class LabelPlacerTest {
  private static final Rectangle2D AREA = new Rectangle2D.Double(0, 0, 200, 100);

  private static List<Point2D> at(double x, double y) {
    return List.of(new Point2D.Double(x, y));
  }

  @Test
  void standsAboveItsPoint() {
    Rectangle2D place =
        new LabelPlacer(AREA, List.of(), List.of()).place(at(100, 50), 40, 10, false).orElseThrow();
    assertThat(place.getCenterX()).isEqualTo(100);
    assertThat(place.getMaxY()).isLessThan(50);
  }

  @Test
  void labelsOfOnePointDoNotLieOnEachOther() {
    LabelPlacer placer = new LabelPlacer(AREA, List.of(), List.of());
    List<Rectangle2D> places = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      places.add(placer.place(at(100, 50), 40, 10, false).orElseThrow());
    }
    for (int i = 0; i < places.size(); i++) {
      assertThat(AREA.contains(places.get(i))).isTrue();
      for (int j = 0; j < i; j++) {
        assertThat(places.get(i).intersects(places.get(j))).isFalse();
      }
    }
  }

  @Test
  void keepsOffCurves() {
    Line2D curve = new Line2D.Double(0, 40, 200, 40);
    Rectangle2D place =
        new LabelPlacer(AREA, List.of(curve), List.of())
            .place(at(100, 50), 40, 10, false)
            .orElseThrow();
    assertThat(place.intersectsLine(curve)).isFalse();
  }

  @Test
  void keepsOffMarksWhereThatIsEasy() {
    Line2D mark = new Line2D.Double(100, 0, 100, 100);
    Rectangle2D place =
        new LabelPlacer(AREA, List.of(), List.of(mark))
            .place(at(100, 50), 40, 10, false)
            .orElseThrow();
    assertThat(place.intersectsLine(mark)).isFalse();
  }

  @Test
  void movesInsideAtTheEdge() {
    Rectangle2D place =
        new LabelPlacer(AREA, List.of(), List.of()).place(at(200, 2), 40, 10, false).orElseThrow();
    assertThat(AREA.contains(place)).isTrue();
  }

  @Test
  void anOptionalOneIsLeftOutWhereThereIsNoRoom() {
    Rectangle2D tight = new Rectangle2D.Double(0, 0, 45, 12);
    LabelPlacer placer = new LabelPlacer(tight, List.of(), List.of());
    assertThat(placer.place(at(20, 6), 40, 10, true)).isPresent();
    assertThat(placer.place(at(20, 6), 40, 10, true)).isEmpty();
    assertThat(placer.place(at(20, 6), 40, 10, false)).isPresent();
  }

  @Test
  void onlyWhatFitsIsPlaced() {
    Optional<Rectangle2D> place =
        new LabelPlacer(AREA, List.of(), List.of()).place(at(20, 6), 400, 10, false);
    assertThat(place).isEmpty();
  }
}
