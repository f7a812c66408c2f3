package loopwright.propose;

import static loopwright.propose.Draft.text;

import java.util.Optional;
import loopwright.part.Polarity;
import loopwright.part.TransistorParameters;
import loopwright.quantity.Unit;

/** First values by hand, from the output back to the input. Every one is noted with its formula. */
final class HandChoices {
  /** Smallest current of the gain stage, A; common practice, no source. */
  private static final double LEAST_GAIN_CURRENT = 1e-3;

  /** Above this the gain stage gets hot and drivers are cheaper, A; common practice, no source. */
  private static final double MOST_GAIN_CURRENT = 8e-3;

  /** A load below this current needs no follower, A; common practice, no source. */
  private static final double WITHOUT_FOLLOWER = 0.4e-3;

  /** The thermal loop is kept at most here: half of what runs away. */
  static final double MOST_RUNAWAY = 0.5;

  /** Corners of blocking capacitors lie so far below the signal. */
  static final double BELOW_SIGNAL = 20;

  private final Specification wanted;
  private final Transistors parts;
  private final Values resistors;
  private final Values capacitors;
  private final Draft draft = new Draft();

  HandChoices(Specification wanted, Transistors parts, Values resistors, Values capacitors) {
    this.wanted = wanted;
    this.parts = parts;
    this.resistors = resistors;
    this.capacitors = capacitors;
  }

  /**
   * Chooses.
   *
   * @throws CannotException where no part at hand stands what is asked, or the rails leave no room
   */
  Draft choose() {
    room();
    smallSignalParts();
    feedback();
    output();
    gainStage();
    pair();
    if (draft.output != Draft.Output.NONE) {
      bias();
    }
    compensation();
    supply();
    if (wanted.single()) {
      blocking();
    }
    return draft;
  }

  /** A swing that no stage of the library can reach is refused before anything is solved. */
  private void room() {
    double needs = wanted.swing() + 1;
    if (needs > wanted.room()) {
      throw new CannotException(
          new Demand(
              "Swing",
              wanted.swing(),
              java.util.OptionalDouble.of(Math.max(0, wanted.room() - 1)),
              Unit.VOLT,
              false,
              "The rails leave "
                  + text(wanted.room(), Unit.VOLT)
                  + " on the nearer side and the output stage needs about 1 V of it (a V_BE and a"
                  + " saturated transistor), "
                  + text(needs - wanted.room(), Unit.VOLT)
                  + " too little: give rails of "
                  + text(Math.ceil(needs), Unit.VOLT)
                  + " from the middle, or ask for "
                  + text(Math.max(0, wanted.room() - 1), Unit.VOLT)
                  + "."));
    }
  }

  private void smallSignalParts() {
    draft.npn = part(Polarity.NPN, 0.5e-3, 0, "input pair");
    draft.pnp = part(Polarity.PNP, 0.5e-3, 0, "pair's load");
    draft.because(
        Draft.PAIR + "transistor",
        draft.npn,
        "The npn at hand with the most β f_T at 0.5 mA, β "
            + text(parts.beta(draft.npn, 0.5e-3), Unit.ONE)
            + ", among those that stand "
            + text(wanted.span(), Unit.VOLT)
            + " with a reserve of a tenth: little base current makes little offset and noise current, and speed leaves margin.");
  }

  private String part(Polarity polarity, double current, double power, String what) {
    return part(polarity, current, power, power, what);
  }

  private String part(
      Polarity polarity, double current, double power, double instant, String what) {
    return parts
        .best(polarity, current, wanted.span(), power, instant)
        .orElseThrow(
            () ->
                new CannotException(
                    new Demand(
                        "Transistor for the " + what,
                        current,
                        java.util.OptionalDouble.empty(),
                        Unit.AMPERE,
                        false,
                        "No "
                            + polarity.name().toLowerCase(java.util.Locale.ROOT)
                            + " at hand stands "
                            + text(wanted.span(), Unit.VOLT)
                            + " with a tenth to spare, "
                            + text(current, Unit.AMPERE)
                            + " at 1.5 times that, and "
                            + text(power, Unit.WATT)
                            + " below 125 °C in free air ("
                            + text(instant, Unit.WATT)
                            + " at the worst level below 140 °C): give another part or a heat sink (a"
                            + " lower thermalResistance in its record), lower rails, a smaller"
                            + " swing, or a higher load resistance.")));
  }

  /** Divider by hand; the ranked one takes its place once the amplifier is known. */
  private void feedback() {
    double source = Math.max(wanted.sourceResistance(), 50);
    double load = wanted.loadResistance().orElse(1e6);
    if (!wanted.inverting() && wanted.gain() < 1.0005) {
      draft.upper = 0;
      draft.because(
          Draft.WITHIN + "feedback.upper",
          "0",
          "Gain 1 is a wire from out to in−: no resistor, no noise of one, no tolerance.");
    } else {
      double total = Math.min(100e3, Math.max(2e3, 10 * load));
      if (wanted.prefers(Preference.QUIET)) {
        total = Math.min(total, Math.max(10 * source, 5 * Math.min(load, 1e4)));
      }
      double ratio = wanted.noiseGain() - 1;
      if (wanted.inverting()) {
        draft.lower = resistors.nearest(Math.max(source, total / (1 + ratio)));
        draft.upper = resistors.nearest(wanted.gain() * (draft.lower + wanted.sourceResistance()));
      } else {
        draft.lower = resistors.nearest(Math.max(total / (1 + ratio), 20));
        draft.upper = resistors.nearest(ratio * draft.lower);
      }
      draft.because(
          Draft.WITHIN + "feedback",
          text(draft.upper, Unit.OHM) + " / " + text(draft.lower, Unit.OHM),
          (wanted.inverting() ? "Gain upper/(inputResistor + source)" : "Gain 1 + upper/lower")
              + "; together about "
              + text(total, Unit.OHM)
              + ", ten times the load or less, so that the divider takes at most a tenth of what"
              + " the load takes, and upper ∥ lower = "
              + text(parallel(), Unit.OHM)
              + " adds √(4kTR) = "
              + text(
                  HandFormulas.inputNoise(1e6, 1e30, 0, 0, 0, parallel()), Unit.VOLT_PER_ROOT_HERTZ)
              + ".");
    }
    double divider =
        draft.upper == 0
            ? 0
            : wanted.swing() / (draft.upper + (wanted.inverting() ? 0 : draft.lower));
    double byLoad =
        wanted.loadResistance().isPresent()
            ? wanted.swing() / wanted.loadResistance().getAsDouble()
            : 0;
    double byCapacitance =
        2 * Math.PI * wanted.signalFrequency() * wanted.loadCapacitance() * wanted.swing();
    draft.peakCurrent = byLoad + divider + byCapacitance;
    draft.because(
        "output current",
        text(draft.peakCurrent, Unit.AMPERE),
        "Peak: swing/R_L + swing/divider + 2π f C_L swing = "
            + text(byLoad, Unit.AMPERE)
            + " + "
            + text(divider, Unit.AMPERE)
            + " + "
            + text(byCapacitance, Unit.AMPERE)
            + ".");
  }

  double parallel() {
    return Double.isNaN(draft.lower)
        ? 0
        : 1
            / (1 / draft.upper
                + 1 / (draft.lower + (wanted.inverting() ? wanted.sourceResistance() : 0)));
  }

  private void output() {
    double peak = draft.peakCurrent;
    if (peak < WITHOUT_FOLLOWER) {
      draft.output = Draft.Output.NONE;
      draft.because(
          "amplifier.outputStage",
          "none",
          "The load takes only "
              + text(peak, Unit.AMPERE)
              + " at the peak, which the gain stage gives itself: a follower would add a V_BE of"
              + " lost swing and a second pole.");
      return;
    }
    double rail = wanted.room();
    double load = wanted.swing() / peak;
    double heat = HandFormulas.classBDissipation(rail, wanted.swing(), load);
    draft.idle = idle(rail, heat);
    double power = heat + rail * draft.idle / 2;
    double level = Math.min(wanted.swing(), rail / 2);
    double instant = Math.max(power, (rail - level) * level / load);
    draft.upperPart = part(Polarity.NPN, peak, power, instant, "upper output transistor");
    draft.lowerPart = part(Polarity.PNP, peak, power, instant, "lower output transistor");
    draft.output = Draft.Output.MULTIPLIER;
    draft.because(
        Draft.OUT + "upper",
        draft.upperPart + ", " + draft.lowerPart,
        "They carry "
            + text(peak, Unit.AMPERE)
            + " and dissipate at worst V V_p/(πR) − V_p²/(4R) at V_p = min(swing, 2V/π): "
            + text(heat, Unit.WATT)
            + " each, "
            + text(power, Unit.WATT)
            + " with the idle current, which puts the hotter junction at 25 °C + P R_θ = "
            + text(
                25
                    + power
                        * Math.max(
                            parts.thermalResistance(draft.upperPart),
                            parts.thermalResistance(draft.lowerPart)),
                Unit.CELSIUS)
            + ". Caution: a direct or reactive load heats more; hot parts burn.");
    double beta = Math.min(parts.beta(draft.upperPart, peak), parts.beta(draft.lowerPart, peak));
    double base = peak / beta;
    double affordable = Math.min(MOST_GAIN_CURRENT, 0.25 / Math.max(wanted.span() / 2, 1));
    draft.drivers = 2 * base > affordable;
    if (draft.drivers) {
      double current = Math.max(2e-3, base / 4);
      draft.upperDriver = part(Polarity.NPN, 1.2 * base, 0.7 * base * rail / 2, "upper driver");
      draft.lowerDriver = part(Polarity.PNP, 1.2 * base, 0.7 * base * rail / 2, "lower driver");
      draft.driverResistor = resistors.nearest(1.3 / current);
      draft.because(
          Draft.OUT + "drivers",
          draft.upperDriver + ", " + draft.lowerDriver,
          "The bases take I_peak/β = "
              + text(base, Unit.AMPERE)
              + " at β "
              + text(beta, Unit.ONE)
              + ", twice of which the gain stage should carry at rest, more than the "
              + text(affordable, Unit.AMPERE)
              + " that it may: drivers, with 2 V_BE/R = "
              + text(1.3 / draft.driverResistor, Unit.AMPERE)
              + " of their own at rest.");
      base /= Math.min(parts.beta(draft.upperDriver, base), parts.beta(draft.lowerDriver, base));
    }
    draft.gainCurrent = 2 * base;
  }

  /** Idle current: a twentieth of the peak, not more than a fifth of the worst heat. */
  private double idle(double rail, double heat) {
    double current = Math.max(1e-3, Math.min(20e-3, draft.peakCurrent / 20));
    current = Math.min(current, Math.max(1e-3, 0.2 * heat / rail));
    if (wanted.prefers(Preference.COOL)) {
      current = Math.max(0.5e-3, current / 2);
    }
    draft.because(
        "idle current",
        text(current, Unit.AMPERE),
        "A twentieth of the peak from 1 to 20 mA, so that both halves conduct where they cross,"
            + " but V I_q not above a fifth of the worst signal dissipation (common practice, no"
            + " source)"
            + (wanted.prefers(Preference.COOL)
                ? "; half of it, since little heat is wanted."
                : "."));
    return current;
  }

  private void gainStage() {
    double need = draft.output == Draft.Output.NONE ? 2.5 * draft.peakCurrent : draft.gainCurrent;
    double current = Math.max(LEAST_GAIN_CURRENT, need);
    if (wanted.loadCapacitance() > 0 && draft.output == Draft.Output.NONE) {
      current = Math.max(current, 2e-3);
    }
    draft.gainCurrent = current;
    draft.gainPart = part(Polarity.PNP, current, current * wanted.span() / 2, "gain stage");
    draft.sourcePart =
        part(Polarity.NPN, current, current * wanted.span() / 2, "gain stage's load");
    draft.because(
        Draft.GAIN + "load",
        text(current, Unit.AMPERE),
        draft.output == Draft.Output.NONE
            ? "2.5 times the peak load current, and at least 1 mA: class A to the peak with a reserve."
            : "Twice the base current at the peak, "
                + text(need / 2, Unit.AMPERE)
                + ", and at least 1 mA: the lower transistor's base gets no more than this.");
    double through = wanted.single() ? wanted.positive() : -wanted.negative();
    double simple = (wanted.room() - 0.7 - wanted.swing()) / Math.max(need / 2 * 1.3, 1e-6);
    draft.gainSource =
        !(wanted.prefers(Preference.SIMPLE) && (wanted.room() - 0.7) / simple <= MOST_GAIN_CURRENT);
    if (draft.gainSource) {
      draft.sourceEmitter = resistors.nearest(Draft.MIRROR_DROP / current);
      draft.gainResistor = setResistor(through, current, draft.sourceEmitter);
      draft.because(
          Draft.GAIN + "load.setResistance",
          draft.gainResistor,
          Unit.OHM,
          "A mirror as load keeps the current to the end of the swing and the gain high;"
              + " (V − V_BE − 0.3 V)/I with V = "
              + text(through, Unit.VOLT)
              + ", and "
              + text(draft.sourceEmitter, Unit.OHM)
              + " in each emitter drops 0.3 V, ten V_T, so that V_BE mismatch of 3 mV moves the"
              + " current by 1 %.");
    } else {
      draft.gainResistor = resistors.nearest(Math.min(simple, (wanted.room() - 0.7) / current));
      draft.gainCurrent = (wanted.room() - 0.7) / draft.gainResistor;
      draft.because(
          Draft.GAIN + "load.resistance",
          draft.gainResistor,
          Unit.OHM,
          "A resistor, since few parts are wanted: (V − V_BE − swing)/(1.3 I_B,peak) still feeds the"
              + " lower base at the end of the swing; it takes "
              + text(draft.gainCurrent, Unit.AMPERE)
              + " at rest.");
    }
    draft.gainEmitter = resistors.nearest(0.05 / draft.gainCurrent);
    draft.because(
        Draft.GAIN + "emitterResistance",
        draft.gainEmitter,
        Unit.OHM,
        "About 50 mV, two V_T: it tames the spread of the transistor at a cost of three in gain.");
  }

  private double setResistor(double volts, double current, double emitter) {
    return resistors.nearest((volts - 0.65 - current * emitter) / current);
  }

  private void pair() {
    double beta = parts.beta(draft.npn, 0.5e-3);
    double source = Math.max(wanted.sourceResistance(), parallel());
    double most = wanted.prefers(Preference.QUIET) ? 2e-3 : 0.5e-3;
    double quiet = HandFormulas.quietCurrent(beta, Math.max(source, 1));
    double each = Math.max(50e-6, Math.min(most, quiet));
    double feeds = 4 * draft.gainCurrent / parts.beta(draft.gainPart, draft.gainCurrent);
    double slew = slewWanted();
    double unity = unityWanted();
    double chosen = Math.max(each, feeds);
    draft.tail = 2 * chosen;
    draft.mirrorLoad = !wanted.prefers(Preference.SIMPLE);
    draft.because(
        Draft.PAIR + "tail",
        text(draft.tail, Unit.AMPERE),
        "Each side: V_T √β/R = "
            + text(quiet, Unit.AMPERE)
            + " is quietest with "
            + text(source, Unit.OHM)
            + " (kept from 50 µA to "
            + text(most, Unit.AMPERE)
            + "), and four times the gain stage's base current is "
            + text(feeds, Unit.AMPERE)
            + "; the larger counts, twice it is the tail. e_n of pair, source and divider by hand"
            + " is "
            + text(
                HandFormulas.inputNoise(
                    chosen,
                    beta,
                    parts
                        .parameters(draft.npn)
                        .map(TransistorParameters::baseResistance)
                        .orElse(0.0),
                    0,
                    wanted.sourceResistance(),
                    parallel()),
                Unit.VOLT_PER_ROOT_HERTZ)
            + ".");
    tailSource();
    double volts = slew / (2 * Math.PI * unity * wanted.noiseGain());
    double degeneration = (volts - HandFormulas.slewVoltage(draft.tail, 0)) / draft.tail;
    draft.degeneration = degeneration > 0 ? resistors.atLeast(degeneration) : 0;
    draft.because(
        Draft.PAIR + "emitterResistance",
        draft.degeneration == 0 ? "0" : text(draft.degeneration, Unit.OHM),
        "Slew rate over 2π f_u NG is 2V_T + I R_E; full swing at twice the signal frequency wants "
            + text(slew, Unit.VOLT_PER_SECOND)
            + ", so "
            + text(volts, Unit.VOLT)
            + (draft.degeneration == 0
                ? ": 2V_T = 51.4 mV is enough without a resistor, which would only add noise."
                : ": (" + text(volts, Unit.VOLT) + " − 51.4 mV)/I_tail."));
    pairLoad();
  }

  private void tailSource() {
    double through = wanted.single() ? wanted.positive() : -wanted.negative();
    draft.tailSource = !wanted.prefers(Preference.SIMPLE);
    if (draft.tailSource) {
      draft.tailEmitter = resistors.nearest(Draft.MIRROR_DROP / draft.tail);
      draft.tailResistor = setResistor(through, draft.tail, draft.tailEmitter);
      draft.because(
          Draft.PAIR + "tail.setResistance",
          draft.tailResistor,
          Unit.OHM,
          "A mirror holds the tail over the input's range: (V − V_BE − 0.3 V)/I, with "
              + text(draft.tailEmitter, Unit.OHM)
              + " in its emitters.");
    } else {
      double across = (wanted.single() ? wanted.middle() : through) - 0.65;
      draft.tailResistor = resistors.nearest(across / draft.tail);
      draft.tail = across / draft.tailResistor;
      draft.because(
          Draft.PAIR + "tail.resistance",
          draft.tailResistor,
          Unit.OHM,
          "A resistor, since few parts are wanted: (V − V_BE)/I; the tail moves with the input.");
    }
  }

  private void pairLoad() {
    double volts =
        parts.baseEmitter(draft.gainPart, draft.gainCurrent)
            + draft.gainCurrent * draft.gainEmitter;
    if (draft.mirrorLoad) {
      draft.pairEmitter = resistors.nearest(0.05 / (draft.tail / 2));
      draft.because(
          Draft.PAIR + "load",
          "mirror",
          "A mirror balances the pair whatever the gain stage's V_BE is, doubles transconductance and"
              + " slew rate, and needs no value; "
              + text(draft.pairEmitter, Unit.OHM)
              + " in each emitter drops 50 mV, two V_T.");
      return;
    }
    double base = draft.gainCurrent / parts.beta(draft.gainPart, draft.gainCurrent);
    draft.pairResistor = resistors.nearest(volts / (draft.tail / 2 - base));
    draft.because(
        Draft.PAIR + "load.output",
        draft.pairResistor,
        Unit.OHM,
        "Half the tail less the gain stage's base current must drop V_BE + I R_E = "
            + text(volts, Unit.VOLT)
            + ": the pair is then balanced; the same in the other collector.");
  }

  private double slewWanted() {
    return 2 * 2 * Math.PI * wanted.signalFrequency() * wanted.swing();
  }

  /** Where the loop gain should pass 1, Hz. */
  private double unityWanted() {
    return Math.max(2 * wanted.bandwidth(), 300e3);
  }

  private void bias() {
    double resistance =
        Math.max(
            HandFormulas.THERMAL_VOLTAGE / draft.idle,
            HandFormulas.leastEmitterResistance(
                wanted.room(),
                Math.max(
                    parts.thermalResistance(draft.upperPart),
                    parts.thermalResistance(draft.lowerPart)),
                draft.idle,
                MOST_RUNAWAY));
    draft.emitterResistor = resistors.atLeast(resistance);
    Optional<String> diode = parts.diode();
    if (!draft.drivers && diode.isPresent()) {
      double apart = 2 * parts.forward(diode.get(), draft.gainCurrent);
      double own =
          parts.baseEmitter(draft.upperPart, draft.idle)
              + parts.baseEmitter(draft.lowerPart, draft.idle);
      double fits = (apart - own) / (2 * draft.idle);
      if (fits >= resistance * 0.9 && fits <= 6 * resistance) {
        draft.output = Draft.Output.DIODES;
        draft.diode = diode.get();
        draft.emitterResistor = resistors.atLeast(fits);
        draft.because(
            Draft.OUT + "bias",
            "two diodes " + draft.diode,
            "Two diodes drop "
                + text(apart, Unit.VOLT)
                + " at the gain stage's current, the two V_BE "
                + text(own, Unit.VOLT)
                + ": what is left, over 2 I_q, is the emitter resistor, and it is large enough"
                + " against runaway.");
      }
    }
    runawayReason();
    if (draft.output == Draft.Output.MULTIPLIER) {
      multiplier(biasWanted());
    }
  }

  private void runawayReason() {
    double thermal =
        Math.max(
            parts.thermalResistance(draft.upperPart), parts.thermalResistance(draft.lowerPart));
    draft.because(
        Draft.OUT + "emitterResistance",
        draft.emitterResistor,
        Unit.OHM,
        "At least V_T/I_q = "
            + text(HandFormulas.THERMAL_VOLTAGE / draft.idle, Unit.OHM)
            + ", and V_CE R_θ κ/(R_E + V_T/I_C) at most 0.5 with κ 2 mV/K and R_θ "
            + text(thermal, Unit.KELVIN_PER_WATT)
            + " wants "
            + text(
                Math.max(
                    0,
                    HandFormulas.leastEmitterResistance(
                        wanted.room(), thermal, draft.idle, MOST_RUNAWAY)),
                Unit.OHM)
            + "; with this value the thermal loop is "
            + text(
                HandFormulas.runaway(wanted.room(), thermal, draft.emitterResistor, draft.idle),
                Unit.ONE)
            + " (it runs away from 1). Caution: bring the idle current up slowly.");
  }

  private double biasWanted() {
    double volts =
        parts.baseEmitter(draft.upperPart, draft.idle)
            + parts.baseEmitter(draft.lowerPart, draft.idle)
            + 2 * draft.idle * draft.emitterResistor;
    if (draft.drivers) {
      double current = 1.3 / draft.driverResistor;
      volts +=
          parts.baseEmitter(draft.upperDriver, current)
              + parts.baseEmitter(draft.lowerDriver, current);
    }
    return volts;
  }

  private void multiplier(double volts) {
    double own = parts.baseEmitter(draft.sourcePart, 0.9 * draft.gainCurrent);
    double through = draft.gainCurrent / 10;
    double base = 0.9 * draft.gainCurrent / parts.beta(draft.sourcePart, draft.gainCurrent);
    draft.biasLower = resistors.nearest(own / through);
    draft.biasUpper = resistors.nearest((volts - own) / (own / draft.biasLower + base));
    draft.because(
        Draft.OUT + "bias",
        text(draft.biasUpper, Unit.OHM) + " / " + text(draft.biasLower, Unit.OHM),
        "A V_BE multiplier: the bases must stand "
            + text(volts, Unit.VOLT)
            + " apart (every V_BE at rest and 2 I_q R_E), V_BE (1 + upper/lower) with V_BE "
            + text(own, Unit.VOLT)
            + "; a tenth of the gain stage's current through the two. Mount it on the output"
            + " transistors.");
  }

  private void compensation() {
    double transconductance =
        HandFormulas.pairTransconductance(draft.tail, draft.degeneration, draft.mirrorLoad);
    double unity = unityWanted();
    double exact = HandFormulas.compensation(transconductance, unity, wanted.noiseGain());
    draft.capacitor = capacitors.atLeast(Math.max(4.7e-12, exact));
    double stage = HandFormulas.THERMAL_VOLTAGE / draft.gainCurrent + draft.gainEmitter;
    draft.nulling = resistors.atLeast(stage);
    draft.because(
        Draft.GAIN + "compensation.capacitance",
        draft.capacitor,
        Unit.FARAD,
        "G_m1/(2π f_u NG) with G_m1 "
            + text(transconductance * 1e3, Unit.ONE)
            + " mS, f_u "
            + text(unity, Unit.HERTZ)
            + " (twice the bandwidth, at least 300 kHz) and noise gain "
            + text(wanted.noiseGain(), Unit.ONE)
            + " is "
            + text(exact, Unit.FARAD)
            + "; slew rate by hand "
            + text(
                HandFormulas.slewRate(draft.tail, draft.capacitor, draft.mirrorLoad),
                Unit.VOLT_PER_SECOND)
            + ".");
    draft.because(
        Draft.GAIN + "compensation.resistance",
        draft.nulling,
        Unit.OHM,
        "1/g_m + R_E of the gain stage, which moves the capacitor's zero away.");
  }

  private void supply() {
    draft.decoupling = capacitors.nearest(10e-6);
    double impedance = Math.sqrt(DraftDesign.LEAD_INDUCTANCE / draft.decoupling);
    draft.decouplingResistor = resistors.atLeast(Math.max(0.1, impedance));
    draft.because(
        "rails.decoupling.capacitance",
        draft.decoupling,
        Unit.FARAD,
        "Half a metre of lead is about 0.5 µH; √(L/C) is then "
            + text(impedance, Unit.OHM)
            + ", and "
            + text(draft.decouplingResistor, Unit.OHM)
            + " of series resistance (the capacitor's own counts) damps it. A 100 nF ceramic beside"
            + " it at the transistors does no harm (common practice, no source).");
  }

  private void blocking() {
    double low = wanted.signalFrequency() / BELOW_SIGNAL;
    draft.midResistor = resistors.nearest(10e3);
    draft.midCapacitor =
        capacitors.atLeast(Math.max(10e-6, HandFormulas.corner(low, draft.midResistor / 2)));
    draft.because(
        "rails.midRail",
        text(draft.midResistor, Unit.OHM) + " twice, " + text(draft.midCapacitor, Unit.FARAD),
        "Half the supply with R/2 = 5 kΩ, steady against base currents of microamperes; 1/(2π f R/2)"
            + " with f a twentieth of the signal's, and at least 10 µF to keep the supply out.");
    double base = draft.tail / 2 / parts.beta(draft.npn, draft.tail / 2);
    if (wanted.inverting()) {
      draft.sourceCapacitor =
          capacitors.atLeast(HandFormulas.corner(low, draft.lower + wanted.sourceResistance()));
    } else {
      double bias = Math.max(50 * wanted.sourceResistance(), 10e3);
      bias = Math.min(bias, 0.1 / base);
      draft.biasResistor = resistors.nearest(bias);
      draft.sourceCapacitor =
          capacitors.atLeast(
              HandFormulas.corner(low, draft.biasResistor + wanted.sourceResistance()));
      draft.because(
          Draft.WITHIN + "source.biasResistance",
          draft.biasResistor,
          Unit.OHM,
          "Fifty times the source, but I_B R at most 0.1 V with I_B "
              + text(base, Unit.AMPERE)
              + ".");
      double ratio = draft.biasResistor / (draft.biasResistor + wanted.sourceResistance());
      if (!Double.isNaN(draft.lower)) {
        draft.upper = resistors.nearest((wanted.gain() / ratio - 1) * draft.lower);
        draft.footCapacitor = capacitors.atLeast(HandFormulas.corner(low, draft.lower));
        draft.because(
            Draft.WITHIN + "feedback.lowerCapacitance",
            draft.footCapacitor,
            Unit.FARAD,
            "1/(2π f R_lower): direct gain 1, so that the output rests at the mid-rail.");
      }
    }
    draft.because(
        Draft.WITHIN + "source.couplingCapacitance",
        draft.sourceCapacitor,
        Unit.FARAD,
        "1/(2π f R) with f a twentieth of the signal's.");
    if (wanted.loadResistance().isPresent()) {
      draft.loadCapacitor =
          capacitors.atLeast(HandFormulas.corner(low, wanted.loadResistance().getAsDouble()));
      draft.because(
          Draft.WITHIN + "load.couplingCapacitance",
          draft.loadCapacitor,
          Unit.FARAD,
          "1/(2π f R_L), which keeps half the supply from the load.");
    }
  }
}
