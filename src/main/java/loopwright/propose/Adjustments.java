package loopwright.propose;

import static loopwright.propose.Draft.text;

import java.util.OptionalDouble;
import loopwright.quantity.Unit;

/** Changes one choice at a time after a prediction, each a bounded number of times. */
final class Adjustments {
  private static final int IDLE_TRIES = 4;
  private static final int CURRENT_TRIES = 4;
  private static final int CAPACITOR_TRIES = 14;

  private final Specification wanted;
  private final Draft draft;
  private final Values resistors;
  private final Values capacitors;

  private int idleTries;
  private int currentTries;
  private int capacitorTries;
  private boolean capacitorGrew;
  private boolean buffered;
  private int nullingTries;

  Adjustments(Specification wanted, Draft draft, Values resistors, Values capacitors) {
    this.wanted = wanted;
    this.draft = draft;
    this.resistors = resistors;
    this.capacitors = capacitors;
  }

  /** Whether idle current or the currents that make the swing were changed. */
  boolean currents(Verdict verdict) {
    return verdict.failure().isEmpty() && (idle(verdict) || swing(verdict));
  }

  /** Whether compensation or loop gain was changed. */
  boolean loop(Verdict verdict) {
    return verdict.failure().isEmpty() && (margin(verdict) || bandwidth(verdict) || gain(verdict));
  }

  private boolean idle(Verdict verdict) {
    if (draft.output == Draft.Output.NONE || idleTries >= IDLE_TRIES) {
      return false;
    }
    OptionalDouble found = verdict.current("out.upper");
    if (found.isEmpty()) {
      return false;
    }
    double now = Math.max(found.getAsDouble(), 1e-6);
    if (now > draft.idle / 1.6 && now < draft.idle * 1.6) {
      return false;
    }
    idleTries++;
    double thermal = HandFormulas.THERMAL_VOLTAGE;
    String solved =
        "Solved idle current "
            + text(now, Unit.AMPERE)
            + ", wanted "
            + text(draft.idle, Unit.AMPERE);
    if (draft.output == Draft.Output.DIODES) {
      double needed =
          (thermal * Math.log(now / draft.idle) + now * draft.emitterResistor) / draft.idle;
      if (needed <= 0.5 * thermal / draft.idle || needed > 100 * thermal / draft.idle) {
        return false;
      }
      double before = draft.emitterResistor;
      draft.emitterResistor = resistors.nearest(needed);
      draft.changed(
          Draft.OUT + "emitterResistance",
          text(draft.emitterResistor, Unit.OHM),
          solved + ": (V_T ln(I/I_q) + I R_E)/I_q.");
      return draft.emitterResistor != before;
    }
    double more =
        2 * (thermal * Math.log(draft.idle / now) + (draft.idle - now) * draft.emitterResistor);
    double present = 0.65 * (1 + draft.biasUpper / draft.biasLower);
    double before = draft.biasUpper;
    double wantedUpper = ((present + more) / 0.65 - 1) * draft.biasLower;
    if (wantedUpper <= 0) {
      return false;
    }
    fit(wantedUpper / draft.biasLower);
    draft.changed(
        Draft.OUT + "bias",
        text(draft.biasUpper, Unit.OHM) + " / " + text(draft.biasLower, Unit.OHM),
        solved
            + ": the bases want "
            + text(more, Unit.VOLT)
            + " more, 2 V_T ln(I_q/I) + 2 R_E (I_q − I).");
    return draft.biasUpper != before;
  }

  /** The pair of the stock nearest to a ratio, its lower within a factor of 1.6 of the present. */
  private void fit(double ratio) {
    double lowest = draft.biasLower / 1.6;
    double highest = draft.biasLower * 1.6;
    double best = Double.POSITIVE_INFINITY;
    double middle = draft.biasLower;
    for (double lower : resistors.all()) {
      if (lower >= lowest && lower <= highest) {
        double upper = resistors.nearest(ratio * lower);
        double miss =
            Math.abs(Math.log(upper / lower / ratio)) + 1e-3 * Math.abs(Math.log(lower / middle));
        if (miss < best) {
          best = miss;
          draft.biasUpper = upper;
          draft.biasLower = lower;
        }
      }
    }
  }

  private boolean swing(Verdict verdict) {
    boolean down = !verdict.meets(Verdict.SWING_DOWN);
    boolean up = !verdict.meets(Verdict.SWING_UP);
    if ((!down && !up) || currentTries >= CURRENT_TRIES || draft.gainCurrent > 15e-3) {
      return false;
    }
    double limit = wanted.room() - 0.8;
    if (wanted.swing() > limit) {
      return false;
    }
    currentTries++;
    double factor = 1.5;
    double before = draft.gainCurrent;
    double room = wanted.single() ? wanted.positive() : -wanted.negative();
    draft.gainCurrent *= factor;
    draft.gainEmitter = resistors.nearest(draft.gainEmitter / factor);
    if (draft.gainSource) {
      draft.sourceEmitter = resistors.nearest(0.1 / draft.gainCurrent);
      draft.gainResistor = resistors.nearest((room - 0.75) / draft.gainCurrent);
    } else {
      draft.gainResistor = resistors.nearest(draft.gainResistor / factor);
    }
    if (!draft.mirrorLoad) {
      draft.pairResistor = resistors.nearest(draft.pairResistor * 1.02);
    }
    if (draft.output == Draft.Output.MULTIPLIER) {
      draft.biasUpper = resistors.nearest(draft.biasUpper / factor);
      draft.biasLower = resistors.nearest(draft.biasLower / factor);
      idleTries = Math.min(idleTries, IDLE_TRIES - 2);
    }
    draft.changed(
        Draft.GAIN + "load",
        text(draft.gainCurrent, Unit.AMPERE),
        "The swing "
            + (down ? "downward" : "upward")
            + " is short with "
            + text(before, Unit.AMPERE)
            + " in the gain stage: half as much again for the base at the peak, and less lost in"
            + " emitter resistors.");
    return true;
  }

  private boolean margin(Verdict verdict) {
    if (verdict.meets(Verdict.MARGIN)) {
      return false;
    }
    boolean roomInBandwidth =
        verdict.share(Verdict.BANDWIDTH) > 1.25 || verdict.solved("bandwidth").isEmpty();
    boolean roomInSlew = verdict.share(Verdict.SLEW) > 1.5;
    if (wanted.loadCapacitance() >= 100e-12 && draft.isolation == 0 && isolationAffordable()) {
      draft.isolation = resistors.nearest(47);
      draft.changed(
          Draft.WITHIN + "load.isolation",
          text(draft.isolation, Unit.OHM),
          "The margin is short with "
              + text(wanted.loadCapacitance(), Unit.FARAD)
              + " at the output; a resistor before it turns its pole into pole and zero. The load"
              + " then sees R_L/(R_L + R) of the output.");
      return true;
    }
    if (roomInBandwidth && roomInSlew && capacitorTries < CAPACITOR_TRIES) {
      double before = draft.capacitor;
      draft.capacitor = capacitors.atLeast(before * 1.4);
      capacitorTries++;
      capacitorGrew = true;
      if (draft.capacitor > before) {
        draft.changed(
            Draft.GAIN + "compensation.capacitance",
            text(draft.capacitor, Unit.FARAD),
            "The worst margin over the swing is "
                + worst(verdict)
                + " with "
                + text(before, Unit.FARAD)
                + ": unity gain must come earlier, and the bandwidth leaves room.");
        return true;
      }
    }
    if (nullingTries < 2) {
      nullingTries++;
      double before = draft.nulling;
      draft.nulling = resistors.atLeast(before * 2);
      draft.changed(
          Draft.GAIN + "compensation.resistance",
          text(draft.nulling, Unit.OHM),
          "The worst margin over the swing is "
              + worst(verdict)
              + " and the bandwidth leaves no room: a larger series resistor puts the zero into the"
              + " left half, where it adds phase.");
      return true;
    }
    return false;
  }

  private boolean isolationAffordable() {
    return wanted.loadResistance().isEmpty() || wanted.loadResistance().getAsDouble() >= 47 * 20;
  }

  private static String worst(Verdict verdict) {
    OptionalDouble worst = verdict.solved("worstPhaseMargin");
    return worst.isPresent() ? text(worst.getAsDouble(), Unit.DEGREE) : "none, since it oscillates";
  }

  private boolean bandwidth(Verdict verdict) {
    boolean tooSlow = !verdict.meets(Verdict.BANDWIDTH) || !verdict.meets(Verdict.SLEW);
    boolean back = capacitorGrew && verdict.share(Verdict.MARGIN) < 1.15;
    if (!tooSlow || back || capacitorTries >= CAPACITOR_TRIES) {
      return false;
    }
    double before = draft.capacitor;
    draft.capacitor = capacitors.below(before / 1.1);
    capacitorTries++;
    if (draft.capacitor >= before) {
      return false;
    }
    draft.changed(
        Draft.GAIN + "compensation.capacitance",
        text(draft.capacitor, Unit.FARAD),
        "Bandwidth or slew rate is short with "
            + text(before, Unit.FARAD)
            + ", and the margin leaves room.");
    return true;
  }

  private boolean gain(Verdict verdict) {
    if (verdict.meets(Verdict.GAIN) || !draft.ranked || buffered) {
      return false;
    }
    buffered = true;
    draft.bufferResistor = resistors.nearest(0.65 / Math.max(draft.gainCurrent / 10, 50e-6));
    draft.changed(
        Draft.GAIN + "buffer.emitterResistance",
        text(draft.bufferResistor, Unit.OHM),
        "The gain is off with the best divider, so the loop gain is too low: a follower before the"
            + " gain stage keeps its base current from the pair; V_BE/R is a tenth of the gain"
            + " stage's current.");
    return true;
  }
}
