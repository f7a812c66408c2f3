package loopwright.bench;

import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import loopwright.design.Design;
import loopwright.design.Reading;
import loopwright.predict.Catalogue;
import loopwright.predict.CostClass;
import loopwright.predict.Figure;
import loopwright.predict.FigureValue;
import loopwright.predict.HookupFigures;
import loopwright.predict.TolerancedPart;
import loopwright.predict.TolerancedParts;
import loopwright.task.Progress;

/**
 * What every reading should show, and how it moves with every part that spreads: the first-order
 * propagation of the tolerances (JCGM 100:2008, 5.1), each part moved by its standard uncertainty
 * up and down.
 */
final class PredictedReadings {
  private final Design design;
  private final HookupFigures first;
  private final List<Reading> readings;
  private final List<TolerancedPart> parts;
  private final FigureValue[] nominal;
  private final double[][] moves;
  private List<ReadingGroup> light = List.of();

  private PredictedReadings(Design design, HookupFigures first) {
    this.design = design;
    this.readings = design.bench().readings();
    this.first = first;
    this.parts = TolerancedParts.of(first);
    this.nominal = new FigureValue[readings.size()];
    this.moves = new double[readings.size()][parts.size()];
  }

  /** Predicts all readings of a design. */
  static PredictedReadings of(Design design, Progress progress) {
    HookupFigures first = HookupFigures.of(design, design.hookups().get(0).name());
    PredictedReadings predicted = new PredictedReadings(design, first);
    List<ReadingGroup> groups = ReadingGroup.of(design);
    List<HookupFigures> start = ReadingGroup.nominal(groups, first);
    for (int i = 0; i < groups.size(); i++) {
      for (int reading : groups.get(i).readings()) {
        predicted.nominal[reading] = predicted.expected(reading, start.get(i));
      }
    }
    predicted.light =
        ReadingGroup.light(
            design,
            first,
            i -> MeasuredValue.of(design, predicted.readings.get(i)).uncertainty().standard(),
            i -> predicted.nominal[i].number().orElse(Double.NaN));
    predicted.move(progress);
    predicted.looseParts();
    return predicted;
  }

  /** The design's first hookup. */
  HookupFigures first() {
    return first;
  }

  /** The circuits in which builds that differ little are predicted. */
  List<ReadingGroup> light() {
    return light;
  }

  /** What a reading should show, or why nothing can be said. */
  FigureValue nominal(int reading) {
    return nominal[reading];
  }

  /** How a reading moves when each part moves by its standard uncertainty. */
  double[] moves(int reading) {
    return moves[reading];
  }

  /** What spreads. */
  List<TolerancedPart> parts() {
    return parts;
  }

  /** Standard uncertainty of a prediction; empty where it is not known. */
  OptionalDouble standard(int reading) {
    double sum = 0;
    for (double move : moves[reading]) {
      sum += move * move;
    }
    return nominal[reading].number().isPresent() && Double.isFinite(sum)
        ? OptionalDouble.of(Math.sqrt(sum))
        : OptionalDouble.empty();
  }

  private void move(Progress progress) {
    int lanes = Runtime.getRuntime().availableProcessors();
    AtomicInteger done = new AtomicInteger();
    IntStream.range(0, lanes)
        .parallel()
        .forEach(
            lane -> {
              // What is solved of a hookup serves one thread, so each lane has its own nominal.
              List<HookupFigures> mine = ReadingGroup.nominal(light, first);
              for (int i = 0; i < light.size(); i++) {
                ReadingGroup group = light.get(i);
                List<TolerancedPart> own = TolerancedParts.in(parts, group.hookup());
                for (int reading : group.readings()) {
                  expected(reading, mine.get(i));
                }
                for (int part = lane; part < own.size(); part += lanes) {
                  progress.check();
                  move(group, mine.get(i), own, part);
                }
                progress.report(
                    (double) done.incrementAndGet() / light.size() / lanes,
                    "predicting what " + group.hookup() + " shows");
              }
            });
  }

  private void move(ReadingGroup group, HookupFigures start, List<TolerancedPart> own, int part) {
    double by = own.get(part).standardUncertainty();
    HookupFigures up = moved(group, start, own, part, by);
    HookupFigures down = moved(group, start, own, part, -by);
    int column = parts.indexOf(own.get(part));
    for (int reading : group.readings()) {
      if (isSpread(reading)) {
        double high = expected(reading, up).number().orElse(Double.NaN);
        double low = expected(reading, down).number().orElse(Double.NaN);
        moves[reading][column] = (high - low) / 2;
      } else {
        moves[reading][column] = Double.NaN;
      }
    }
  }

  private static HookupFigures moved(
      ReadingGroup group, HookupFigures start, List<TolerancedPart> own, int part, double by) {
    double[] deviations = new double[own.size()];
    deviations[part] = by;
    return start.of(TolerancedParts.build(group.circuit(), own, deviations));
  }

  private FigureValue expected(int reading, HookupFigures figures) {
    return new Expectation(readings.get(reading)).of(figures);
  }

  /** A solution in time for every part would take too long. */
  private boolean isSpread(int reading) {
    return Catalogue.find(readings.get(reading).quantity())
        .map(Figure::cost)
        .filter(cost -> cost == CostClass.TIME)
        .isEmpty();
  }

  private void looseParts() {
    for (int i = 0; i < readings.size(); i++) {
      if (readings.get(i).hookup().isEmpty()) {
        LoosePart loose = LoosePart.of(design, first, readings.get(i));
        nominal[i] = loose.nominal();
        for (int part = 0; part < parts.size(); part++) {
          moves[i][part] = loose.move(parts.get(part));
        }
      }
    }
  }
}
