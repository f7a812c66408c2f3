package loopwright.predict;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.design.Hookup;

/**
 * What a hookup should show.
 *
 * @param hookup the test set-up
 * @param rest the amplifier at rest; empty when it could not be solved
 * @param failure why it could not; empty when it could
 * @param figures by key, in the catalogue's order; one result for every entry
 * @param response out over generator at rest
 * @param loopGain at rest; empty with an open hookup
 * @param unstablePoles growing natural frequencies at rest
 * @param overSwing the linear circuit at every output level
 * @param swingRemark what is to be said about the levels, or empty
 * @param offsetContributions what makes the output offset, adding up to it
 * @param harmonics peak values, V, index 0 the mean; empty without a waveform
 * @param waveform the static waveform; empty without an amplitude
 * @param notes what is to be said about how it was solved
 */
public record HookupPrediction(
    Hookup hookup,
    Optional<RestState> rest,
    String failure,
    Map<String, FigureResult> figures,
    List<ComplexPoint> response,
    List<ComplexPoint> loopGain,
    List<Root> unstablePoles,
    List<SwingLevel> overSwing,
    String swingRemark,
    List<OffsetShare> offsetContributions,
    List<Double> harmonics,
    Optional<Waveform> waveform,
    List<SolveNote> notes) {
  /** Keeps its own copies. */
  public HookupPrediction {
    figures = Collections.unmodifiableMap(new LinkedHashMap<>(figures));
    response = List.copyOf(response);
    loopGain = List.copyOf(loopGain);
    unstablePoles = List.copyOf(unstablePoles);
    overSwing = List.copyOf(overSwing);
    offsetContributions = List.copyOf(offsetContributions);
    harmonics = List.copyOf(harmonics);
    notes = List.copyOf(notes);
  }

  /** The same with other results of its figures. */
  HookupPrediction withFigures(Map<String, FigureResult> others) {
    return new HookupPrediction(
        hookup,
        rest,
        failure,
        others,
        response,
        loopGain,
        unstablePoles,
        overSwing,
        swingRemark,
        offsetContributions,
        harmonics,
        waveform,
        notes);
  }
}
