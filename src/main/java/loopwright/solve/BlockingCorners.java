package loopwright.solve;

import java.util.ArrayList;
import java.util.List;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.CircuitState;
import loopwright.circuit.Element;

/**
 * The corner of each blocking capacitor with the resistance that it sees, all others being shorts.
 */
public final class BlockingCorners {
  private BlockingCorners() {}

  /**
   * A corner.
   *
   * @param name path of the capacitor
   * @param frequency 1/(2πRC), Hz
   */
  public record Corner(String name, double frequency) {}

  /**
   * All corners at a solved state.
   *
   * @param state with blocking capacitors held; evaluated again, its unknowns unchanged
   */
  public static List<Corner> of(CircuitState state) {
    StaticSolver solver = new StaticSolver(state.circuit());
    List<Corner> corners = new ArrayList<>();
    for (Element element : state.circuit().elements()) {
      if (element instanceof BlockingCapacitor capacitor) {
        CircuitState open = state.copy();
        open.openOnly(capacitor);
        open.evaluate();
        if (solver.factor(open)) {
          double resistance = resistance(solver, capacitor, state.circuit().unknowns());
          corners.add(
              new Corner(
                  capacitor.name(),
                  1 / (2 * Math.PI * Math.abs(resistance) * capacitor.capacitance())));
        }
      }
    }
    return corners;
  }

  private static double resistance(StaticSolver solver, BlockingCapacitor capacitor, int unknowns) {
    double[] vector = new double[unknowns];
    add(vector, capacitor.from(), 1);
    add(vector, capacitor.to(), -1);
    solver.backSolve(vector);
    return at(vector, capacitor.from()) - at(vector, capacitor.to());
  }

  private static void add(double[] vector, int node, double value) {
    if (node >= 0) {
      vector[node] += value;
    }
  }

  private static double at(double[] vector, int node) {
    return node < 0 ? 0 : vector[node];
  }
}
