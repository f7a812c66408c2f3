package loopwright.assembly;

import java.util.Optional;
import loopwright.circuit.CircuitBuilder;
import loopwright.circuit.Physics;
import loopwright.design.Design;
import loopwright.design.FiguresAmplifier;
import loopwright.design.Hookup;
import loopwright.design.StagesAmplifier;
import loopwright.part.Polarity;

/** Makes the circuit of a design in a hookup, stage by stage. */
public final class Assembler {
  private Assembler() {}

  /**
   * Assembles with every junction at ambient temperature.
   *
   * @throws AssemblyException when the design names a node or part that is not there
   */
  public static AssembledHookup assemble(Design design, Hookup hookup) {
    return assemble(
        design, hookup, new DeviceModels(design), Temperatures.ambient(design), Optional.empty());
  }

  /**
   * Assembles with junction temperatures of one's own.
   *
   * @param models of the same design; kept from one assembly to the next they save the fits
   * @param like a hookup that may differ in values only, to save what was learnt of its matrix
   * @throws AssemblyException when the design names a node or part that is not there
   */
  public static AssembledHookup assemble(
      Design design,
      Hookup hookup,
      DeviceModels models,
      Temperatures temperatures,
      Optional<AssembledHookup> like) {
    CircuitBuilder circuit = collect(design, hookup, models, temperatures);
    double stray = design.surroundings().strayCapacitance().value();
    return new AssembledHookup(
        design, hookup, circuit.build(stray, like.map(AssembledHookup::circuit)), models);
  }

  /**
   * The same circuit with its output held by an ideal source, {@link AssembledHookup#holder()}.
   *
   * @param volts at which the output is held, V
   */
  public static AssembledHookup assembleHeld(
      AssembledHookup free, Temperatures temperatures, double volts) {
    Design design = free.design();
    CircuitBuilder circuit = collect(design, free.hookup(), free.models(), temperatures);
    circuit.supply(HookupNodes.HOLDER, Nodes.OUT, volts);
    double stray = design.surroundings().strayCapacitance().value();
    return new AssembledHookup(design, free.hookup(), circuit.build(stray), free.models());
  }

  private static CircuitBuilder collect(
      Design design, Hookup hookup, DeviceModels models, Temperatures temperatures) {
    double ambient = Physics.ZERO_CELSIUS + design.surroundings().ambient().value();
    CircuitBuilder circuit = new CircuitBuilder(ambient);
    Polarity polarity =
        design.amplifier() instanceof StagesAmplifier stages
            ? models.polarity("pair.q1", stages.inputPair().transistor())
            : Polarity.NPN;
    Workpiece work = new Workpiece(design, models, temperatures, circuit, polarity);

    RailsAssembly.add(work);
    SourceAssembly.add(work, hookup);
    if (design.amplifier() instanceof StagesAmplifier stages) {
      InputPairAssembly.add(work, stages.inputPair());
      String loadNode = OutputStageAssembly.add(work, stages.outputStage());
      GainStageAssembly.add(work, stages.gainStage(), loadNode);
    } else if (design.amplifier() instanceof FiguresAmplifier figures) {
      FiguresAssembly.add(work, figures);
    }
    FeedbackAssembly.add(work, hookup);
    LoadAssembly.add(work, hookup);
    ExtrasAssembly.add(work, hookup);
    LoadAssembly.addProbes(work, hookup);
    return circuit;
  }
}
