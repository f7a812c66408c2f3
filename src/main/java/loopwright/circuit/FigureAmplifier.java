package loopwright.circuit;

import java.util.stream.DoubleStream;

/**
 * An amplifier known by its figures, between its input nodes and its two output nodes:
 *
 * <pre>
 * v_x = gain (v_in+ − v_in− − offset) + (gain/commonModeRejection)(v_in+ + v_in−)/2, through the poles
 * gainOut = v_x, clamped at the limits widened by the dead zone
 * out = v_x moved toward zero by the dead zone, clamped at the limits, behind the output resistance
 * </pre>
 *
 * <p>The curve from v_x to the output is piecewise linear and rises; Newton steps move by one piece
 * at a time, which always ends (Katzenelson 1965, for a rising curve).
 */
public final class FigureAmplifier implements Element {
  /**
   * What is known of it.
   *
   * @param gain at dc
   * @param offset V
   * @param commonModeRejection ratio, may be infinite
   * @param deadZone half-width, V
   * @param low lowest output, V
   * @param high highest output, V
   * @param outputResistance Ω
   * @param slewRate fastest change of v_x, V/s, may be infinite; it acts in time only
   * @param poleRates 2π times each pole frequency, rad/s
   */
  public record Figures(
      double gain,
      double offset,
      double commonModeRejection,
      double deadZone,
      double low,
      double high,
      double outputResistance,
      double slewRate,
      double[] poleRates) {
    /**
     * Keeps the poles fastest first: the slowest is then the one whose rate the slew limit holds,
     * and nothing before it stores what it cannot follow.
     */
    public Figures {
      poleRates = DoubleStream.of(poleRates).map(r -> -r).sorted().map(r -> -r).toArray();
    }
  }

  /** Node indices. */
  record Nodes(int inPlus, int inMinus, int gainOut, int out) {}

  /**
   * Where no pole is stated a slew limit needs a rate of its own: it is that of a pole which
   * crosses the whole output range in this share of the time that slewing takes.
   */
  private static final double UNSTATED_POLE = 1e-4;

  private final Figures figures;
  private final Nodes nodes;
  private final int firstStage;
  private final int stages;
  private final int gainBranch;
  private final int outBranch;
  private final int memory;
  private final double turnHigh;
  private final double turnLow;
  private final int[] stageSlots;
  private final int[] chainSlots;
  private final int inPlusSlot;
  private final int inMinusSlot;
  private final int[] gainSlots;
  private final int[] outSlots;

  FigureAmplifier(
      Figures figures, Nodes nodes, int firstBranch, int memory, CircuitBuilder builder) {
    this.figures = figures;
    this.nodes = nodes;
    this.firstStage = firstBranch;
    this.stages = stages(figures);
    this.gainBranch = firstBranch + stages;
    this.outBranch = gainBranch + 1;
    this.memory = memory;
    double zone = figures.deadZone();
    this.turnHigh = figures.high() + zone * Math.signum(figures.high());
    this.turnLow = figures.low() + zone * Math.signum(figures.low());
    this.stageSlots = new int[stages];
    this.chainSlots = new int[stages];
    for (int k = 0; k < stages; k++) {
      stageSlots[k] = builder.slot(firstStage + k, firstStage + k);
      chainSlots[k] = k == 0 ? -1 : builder.slot(firstStage + k, firstStage + k - 1);
    }
    this.inPlusSlot = builder.slot(firstStage, nodes.inPlus());
    this.inMinusSlot = builder.slot(firstStage, nodes.inMinus());
    int drive = firstStage + stages - 1;
    this.gainSlots =
        new int[] {
          builder.slot(nodes.gainOut(), gainBranch),
          builder.slot(gainBranch, nodes.gainOut()),
          builder.slot(gainBranch, drive)
        };
    this.outSlots =
        new int[] {
          builder.slot(nodes.out(), outBranch),
          builder.slot(outBranch, nodes.out()),
          builder.slot(outBranch, drive),
          builder.slot(outBranch, outBranch)
        };
  }

  /** How many unknowns beyond the nodes it needs. */
  static int branches(Figures figures) {
    return stages(figures) + 2;
  }

  private static int stages(Figures figures) {
    return Math.max(1, figures.poleRates().length);
  }

  @Override
  public String name() {
    return "amplifier";
  }

  /** The figures. */
  public Figures figures() {
    return figures;
  }

  /** Current out of the output node into what hangs on it at a state, A. */
  public double outputCurrent(CircuitState state) {
    return state.voltage(outBranch);
  }

  @Override
  public void stamp(CircuitState state) {
    stampStages(state);
    Stamps stamps = state.stamps();
    double drive = state.voltage(firstStage + stages - 1);

    double widest = figures.high() + figures.deadZone();
    double lowest = figures.low() - figures.deadZone();
    double gainOut = Math.max(lowest, Math.min(widest, drive));
    double gainSlope = drive > lowest && drive < widest ? 1 : 0;
    stamps.current(nodes.gainOut(), -state.voltage(gainBranch), 0);
    stamps.conductance(gainSlots[0], -1);
    double gainNode = state.voltage(nodes.gainOut());
    stamps.current(gainBranch, gainNode - gainOut, Math.abs(gainOut) + Math.abs(gainNode));
    stamps.conductance(gainSlots[1], 1);
    stamps.conductance(gainSlots[2], -gainSlope);

    int piece = nextPiece(state, drive);
    double slope = slope(piece);
    double output = pieceValue(piece, drive);
    double current = state.voltage(outBranch);
    stamps.current(nodes.out(), -current, 0);
    stamps.conductance(outSlots[0], -1);
    double outNode = state.voltage(nodes.out());
    stamps.current(
        outBranch,
        outNode + figures.outputResistance() * current - output,
        Math.abs(output) + Math.abs(drive) + Math.abs(outNode));
    stamps.conductance(outSlots[1], 1);
    stamps.conductance(outSlots[2], -slope);
    stamps.conductance(outSlots[3], figures.outputResistance());
  }

  private void stampStages(CircuitState state) {
    Stamps stamps = state.stamps();
    double plus = state.voltage(nodes.inPlus());
    double minus = state.voltage(nodes.inMinus());
    double common = figures.gain() / figures.commonModeRejection() / 2;
    double byPlus = common + figures.gain();
    double byMinus = common - figures.gain();
    double input = byPlus * plus + byMinus * minus - figures.gain() * figures.offset();
    double inputSize =
        Math.abs(byPlus * plus)
            + Math.abs(byMinus * minus)
            + Math.abs(figures.gain() * figures.offset());
    for (int k = 0; k < stages; k++) {
      int row = firstStage + k;
      double value = state.voltage(row);
      double from = k == 0 ? input : state.voltage(row - 1);
      double size = k == 0 ? inputSize : Math.abs(from);
      double time = time(k, state);
      double most = mostLag(k, time, state);
      double difference = Math.max(-most, Math.min(most, from - value));
      double slope = Math.abs(from - value) <= most ? 1 : 0;
      stamps.current(row, -difference, Math.abs(value) + size);
      stamps.conductance(stageSlots[k], slope);
      if (k == 0) {
        stamps.conductance(inPlusSlot, -slope * byPlus);
        stamps.conductance(inMinusSlot, -slope * byMinus);
      } else {
        stamps.conductance(chainSlots[k], -slope);
      }
      if (time > 0) {
        stamps.charge(row, time * value);
        stamps.capacitance(stageSlots[k], time);
      }
    }
  }

  /** Time constant of a stage, s; 0 when it follows at once. */
  private double time(int stage, CircuitState state) {
    if (figures.poleRates().length > 0) {
      return 1 / figures.poleRates()[stage];
    }
    return state.moving() && Double.isFinite(figures.slewRate())
        ? UNSTATED_POLE * (figures.high() - figures.low()) / figures.slewRate()
        : 0;
  }

  /** How far a stage may lag behind what drives it, V: by the slew limit, in the last stage. */
  private double mostLag(int stage, double time, CircuitState state) {
    return stage == stages - 1 && state.moving() && Double.isFinite(figures.slewRate())
        ? time * figures.slewRate()
        : Double.POSITIVE_INFINITY;
  }

  /** The piece to linearise on: at most one further than the last, towards the drive's own. */
  private int nextPiece(CircuitState state, double drive) {
    int last = (int) state.memory(memory);
    int own = piece(drive);
    int next = last + Integer.signum(own - last);
    state.setMemory(memory, next);
    if (next != own) {
      state.setLimited();
    }
    return next;
  }

  /** −2 and 2: at a limit; −1 and 1: outside the dead zone; 0: inside it. */
  private int piece(double drive) {
    if (drive >= turnHigh) {
      return 2;
    }
    if (drive <= turnLow) {
      return -2;
    }
    if (drive > figures.deadZone()) {
      return 1;
    }
    return drive < -figures.deadZone() ? -1 : 0;
  }

  private double slope(int piece) {
    return switch (piece) {
      case 1, -1 -> 1;
      case 0 -> figures.deadZone() == 0 ? 1 : 0;
      default -> 0;
    };
  }

  private double pieceValue(int piece, double drive) {
    return switch (piece) {
      case 2 -> figures.high();
      case 1 -> drive - figures.deadZone();
      case 0 -> figures.deadZone() == 0 ? drive : 0;
      case -1 -> drive + figures.deadZone();
      default -> figures.low();
    };
  }
}
