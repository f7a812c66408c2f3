package loopwright.propose;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** The choices of one run while they are being made, each with its reason. */
final class Draft {
  /** What holds the output transistors' bases apart. */
  enum Output {
    NONE,
    DIODES,
    MULTIPLIER
  }

  static final String HOOKUP = "main";
  static final String PAIR = "amplifier.inputPair.";
  static final String GAIN = "amplifier.gainStage.";
  static final String OUT = "amplifier.outputStage.";
  static final String WITHIN = "hookups." + HOOKUP + ".";

  /** Share of the tail or load current that flows in the mirror's emitter resistors, V. */
  static final double MIRROR_DROP = 0.3;

  String npn = "";
  String pnp = "";
  String gainPart = "";
  String sourcePart = "";
  String upperPart = "";
  String lowerPart = "";
  String upperDriver = "";
  String lowerDriver = "";
  String diode = "";

  double peakCurrent;
  double tail;
  double tailResistor;
  double tailEmitter;
  double degeneration;
  boolean mirrorLoad = true;
  boolean tailSource = true;
  double pairResistor;
  double pairEmitter;
  double gainCurrent;
  double gainResistor;
  double gainEmitter;
  double sourceEmitter;
  boolean gainSource = true;
  double bufferResistor;
  double capacitor;
  double nulling;
  Output output = Output.NONE;
  boolean drivers;
  double driverResistor;
  double idle;
  double emitterResistor;
  double biasUpper;
  double biasLower;
  double upper;
  double lower = Double.NaN;
  double isolation;
  double midResistor;
  double midCapacitor;
  double sourceCapacitor;
  double biasResistor;
  double footCapacitor;
  double loadCapacitor;
  double decoupling;
  double decouplingResistor;

  /** Whether the divider was ranked among all of the stock. */
  boolean ranked;

  private final Map<String, Reason> reasons = new LinkedHashMap<>();
  private final List<Reason> changes = new ArrayList<>();

  /** Notes why a value is what it is. */
  void because(String path, String value, String says) {
    reasons.put(path, new Reason(path, value, says));
  }

  void because(String path, double value, Unit unit, String says) {
    because(path, text(value, unit), says);
  }

  /** Notes what was changed after a prediction. */
  void changed(String path, String value, String says) {
    changes.add(new Reason(path, value, says));
  }

  List<Reason> reasons() {
    List<Reason> all = new ArrayList<>(reasons.values());
    all.addAll(changes);
    return all;
  }

  static String text(double value, Unit unit) {
    return EngineeringFormat.format(value, unit, 3);
  }
}
