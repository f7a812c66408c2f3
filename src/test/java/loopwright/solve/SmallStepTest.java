package loopwright.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loopwright.assembly.AssembledHookup;
import loopwright.assembly.Assembler;
import loopwright.circuit.CircuitState;
import loopwright.design.Design;
import loopwright.file.ExampleDesigns;
import loopwright.solve.Transient.Accuracy;
import loopwright.task.Progress;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Two roads to one answer: a step so small that everything stays linear, in time and from the
 * natural frequencies and residues of the small-signal circuit.
 */
class SmallStepTest {
  private static final double STEP = 1e-5;

  @ParameterizedTest
  @CsvSource({
    "seismometer-coil.json, divider, 3e-6",
    "seismometer-coil.json, follower, 1e-6",
    "hydrophone-follower.json, line, 1e-6",
    "measured-amplifier.json, inverting, 1e-6"
  })
  void agreesWithPolesAndResidues(String file, String hookupName, double span) {
    Design design = ExampleDesigns.read(file);
    AssembledHookup hookup = Assembler.assemble(design, design.hookup(hookupName).orElseThrow());
    OperatingPoint point = OperatingPointSolver.solve(hookup.circuit());
    assertThat(point).isInstanceOf(OperatingPoint.Found.class);
    CircuitState rest = ((OperatingPoint.Found) point).state();
    SmallSignalCircuit network = new SmallSignalCircuit(hookup.circuit());
    network.linearise(rest);
    StepResponse response = new StepResponse(network, hookup.generator().branch(), hookup.out());
    double before = rest.voltage(hookup.out());
    Transient run =
        new Transient(
            rest,
            GeneratorSignal.step(rest.generator(), rest.generator() + STEP, 0),
            new Accuracy(1e-6, 1e-11, 1e-11));
    double size =
        STEP * Math.abs(network.response(0, hookup.generator().branch(), hookup.out())[0]);
    for (int k = 1; k <= 20; k++) {
      double time = span * k / 20;
      run.advance(time, (t, state) -> {}, Progress.none());
      double moved = run.state().voltage(hookup.out()) - before;
      assertThat(moved)
          .as("%s at %s s", hookupName, time)
          .isCloseTo(STEP * response.at(time), within(1e-4 * size));
    }
  }
}
