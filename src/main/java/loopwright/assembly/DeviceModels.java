package loopwright.assembly;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loopwright.characterise.DiodeFit;
import loopwright.characterise.FitException;
import loopwright.characterise.FittedDiode;
import loopwright.characterise.FittedTransistor;
import loopwright.characterise.TransistorFit;
import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.DeviceChoice;
import loopwright.design.StagesAmplifier;
import loopwright.part.DiodeParameters;
import loopwright.part.DiodeRecord;
import loopwright.part.PartRecord;
import loopwright.part.Polarity;
import loopwright.part.TransistorMeasured;
import loopwright.part.TransistorParameters;
import loopwright.part.TransistorRecord;

/**
 * Records and fitted parameters of a design's devices by role. Fits are made once for each choice.
 */
public final class DeviceModels {
  private final Design design;
  private final Deviations deviations;
  private final Map<Choice, TransistorParameters> transistors = new HashMap<>();
  private final Map<String, DiodeParameters> diodes = new HashMap<>();

  private final Map<String, List<String>> notes = new LinkedHashMap<>();
  private final Map<String, String> usedParts = new HashMap<>();

  private record Choice(String part, Optional<TransistorMeasured> measured) {}

  /** Models of the devices of one design, all as their records say. */
  public DeviceModels(Design design) {
    this(design, Deviations.NONE);
  }

  private DeviceModels(Design design, Deviations deviations) {
    this.design = design;
    this.deviations = deviations;
  }

  /** How this build differs from the design. */
  public Deviations deviations() {
    return deviations;
  }

  /**
   * Models for a design that differs from this one's in values. Fits of records that it has in
   * common with this one's are taken over.
   *
   * @param other the design
   * @param differing how the build differs from it
   */
  public DeviceModels of(Design other, Deviations differing) {
    DeviceModels models = new DeviceModels(other, differing);
    if (other.parts().equals(design.parts())) {
      models.transistors.putAll(transistors);
      models.diodes.putAll(diodes);
      models.notes.putAll(notes);
    }
    return models;
  }

  /**
   * The record of a device that was assembled.
   *
   * @throws IllegalArgumentException when no device of this role was
   */
  public PartRecord record(String role) {
    return part(used(role));
  }

  /** Parameters at 25 °C of a transistor that was assembled. */
  public TransistorParameters transistor(String role) {
    return transistor(role, used(role));
  }

  /** Polarity of a transistor. */
  Polarity polarity(String role, String stagePart) {
    return transistorRecord(partName(role, stagePart)).kind();
  }

  /** Parameters of a transistor at 25 °C. */
  TransistorParameters transistor(String role, String stagePart) {
    Optional<TransistorMeasured> measured = choice(role).flatMap(DeviceChoice::measured);
    TransistorParameters parameters =
        transistors.computeIfAbsent(
            new Choice(partName(role, stagePart), measured),
            choice -> fitted(choice.part(), transistorRecord(choice.part()), measured));
    TransistorParameters own = deviating(parameters, deviations.devices().get(role));
    return role.equals("pair.q1") ? mismatched(own) : own;
  }

  /** Parameters of a diode at 25 °C. */
  DiodeParameters diode(String role, String stagePart) {
    String name = partName(role, stagePart);
    DiodeParameters parameters = diodes.computeIfAbsent(name, key -> fitted(key, diodeRecord(key)));
    DeviceDeviation own = deviations.devices().get(role);
    return own == null ? parameters : higher(parameters, own.baseEmitterVoltage());
  }

  /** What a person should know of the fits that were made, by part name. */
  public Map<String, List<String>> notes() {
    return notes;
  }

  private TransistorParameters fitted(
      String name, TransistorRecord record, Optional<TransistorMeasured> measured) {
    try {
      FittedTransistor fitted = TransistorFit.fit(record, measured);
      notes.put(name, fitted.notes());
      return fitted.parameters();
    } catch (FitException e) {
      throw new AssemblyException("parts." + name + ": " + e.getMessage());
    }
  }

  private DiodeParameters fitted(String name, DiodeRecord record) {
    try {
      FittedDiode fitted = DiodeFit.fit(record);
      notes.put(name, fitted.notes());
      return fitted.parameters();
    } catch (FitException e) {
      throw new AssemblyException("parts." + name + ": " + e.getMessage());
    }
  }

  private TransistorParameters mismatched(TransistorParameters parameters) {
    double mismatch =
        design.amplifier() instanceof StagesAmplifier stages
            ? stages.inputPair().baseEmitterMismatch().value()
            : 0;
    return higher(parameters, mismatch);
  }

  private static TransistorParameters deviating(
      TransistorParameters parameters, DeviceDeviation deviation) {
    // Both parts of the base current are divided, so that the ratio holds at every current.
    return deviation == null
        ? parameters
        : higher(parameters, deviation.baseEmitterVoltage())
            .withForwardBeta(parameters.forwardBeta() * deviation.betaRatio())
            .withRecombinationCurrent(parameters.recombinationCurrent() / deviation.betaRatio());
  }

  /** Parameters of a transistor that needs more V_BE, V, for the same current at 25 °C. */
  private static TransistorParameters higher(TransistorParameters parameters, double volts) {
    double factor = Math.exp(-volts / Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE));
    return parameters.withSaturationCurrent(parameters.saturationCurrent() * factor);
  }

  /** Parameters of a diode that needs more forward voltage, V, for the same current at 25 °C. */
  private static DiodeParameters higher(DiodeParameters parameters, double volts) {
    double emission = parameters.ideality() * Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);
    return new DiodeParameters(
        parameters.saturationCurrent() * Math.exp(-volts / emission),
        parameters.ideality(),
        parameters.seriesResistance(),
        parameters.capacitance(),
        parameters.transitTime());
  }

  private Optional<DeviceChoice> choice(String role) {
    return Optional.ofNullable(design.devices().get(role));
  }

  private String partName(String role, String stagePart) {
    String name = choice(role).flatMap(DeviceChoice::part).orElse(stagePart);
    usedParts.put(role, name);
    return name;
  }

  private String used(String role) {
    String name = usedParts.get(role);
    if (name == null) {
      throw new IllegalArgumentException("no device " + role + " was assembled");
    }
    return name;
  }

  private TransistorRecord transistorRecord(String name) {
    if (part(name) instanceof TransistorRecord record) {
      return record;
    }
    throw new AssemblyException("parts." + name + ": found a diode, expected a transistor");
  }

  private DiodeRecord diodeRecord(String name) {
    if (part(name) instanceof DiodeRecord record) {
      return record;
    }
    throw new AssemblyException("parts." + name + ": found a transistor, expected a diode");
  }

  private PartRecord part(String name) {
    PartRecord record = design.parts().get(name);
    if (record == null) {
      throw new AssemblyException(
          "parts."
              + name
              + ": found no record of this name, expected one in the file or on a shelf");
    }
    return record;
  }
}
