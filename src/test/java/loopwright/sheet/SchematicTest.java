package loopwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.LongStream;
import javax.imageio.ImageIO;
import loopwright.assembly.Assembler;
import loopwright.circuit.BlockingCapacitor;
import loopwright.circuit.Capacitor;
import loopwright.circuit.Circuit;
import loopwright.circuit.CurrentSourceElement;
import loopwright.circuit.DeviceTerminals;
import loopwright.circuit.Element;
import loopwright.circuit.Lead;
import loopwright.circuit.Resistor;
import loopwright.design.Design;
import loopwright.design.RandomDesigns;
import loopwright.file.DesignText;
import loopwright.predict.CostClass;
import loopwright.predict.Predictor;
import loopwright.task.Progress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Every variant of every stage is drawn legibly, and the drawing connects what the circuit does.
 */
class SchematicTest {
  private static final int DESIGNS = 120;
  private static final int PICTURES = 24;

  static LongStream seeds() {
    return LongStream.rangeClosed(1, DESIGNS);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theDrawingConnectsWhatTheCircuitDoes(long seed) {
    connects(RandomDesigns.of(seed));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "everything-fitted",
        "hydrophone-follower",
        "measured-amplifier",
        "nine-volt-preamplifier",
        "seismometer-coil"
      })
  void examplesAreConnectedAndLegible(String example) throws IOException {
    Design design = DesignText.example(example);
    for (int k = 0; k < design.hookups().size(); k++) {
      String name = design.hookups().get(k).name();
      SchematicDrawing drawing = SchematicDrawing.of(design, name);
      Optional<SchematicOverlay> overlay =
          SchematicOverlay.of(
              Predictor.predict(
                      design, List.of(name), new double[] {1e3}, CostClass.LINEAR, Progress.none())
                  .hookups()
                  .get(0));
      save(drawing, Optional.empty(), "schematic-" + example + "-" + k);
      save(drawing, overlay, "schematic-" + example + "-" + k + "-overlay");
      isLegible(drawing, example);
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void nothingLiesOverAnotherThing(long seed) throws IOException {
    Design design = RandomDesigns.of(seed);
    SchematicDrawing drawing = SchematicDrawing.of(design, "main");
    if (seed <= PICTURES) {
      save(drawing, Optional.empty(), "schematic-random-" + seed);
    }
    isLegible(drawing, "random design " + seed);
  }

  @Test
  void aPartIsFoundUnderThePointer() {
    Design design = DesignText.example("seismometer-coil");
    SchematicDrawing drawing = SchematicDrawing.of(design, design.hookups().get(0).name());
    for (String part : drawing.parts()) {
      Rectangle2D area = drawing.area(part).orElseThrow();
      assertThat(drawing.partAt(area.getCenterX(), area.getCenterY())).contains(part);
    }
    assertThat(drawing.partAt(-5, -5)).isEmpty();
    assertThat(drawing.parts()).doesNotHaveDuplicates().contains("pair.q1", "gain.q1");
  }

  private static void isLegible(SchematicDrawing drawing, String name) {
    SchematicLayout layout = drawing.layout();
    Map<SchematicLabel, Rectangle2D> labels = new HashMap<>(drawing.labelBoxes());
    assertThat(labels.keySet().stream().filter(l -> l.kind() == SchematicLabel.Kind.PART))
        .hasSize(layout.symbols().size());
    List<Map.Entry<SchematicLabel, Rectangle2D>> all = new ArrayList<>(labels.entrySet());
    all.addAll(drawing.nodeBoxes().entrySet());
    List<String> faults = new ArrayList<>();
    for (int i = 0; i < all.size(); i++) {
      Rectangle2D box = shrunk(all.get(i).getValue());
      String who = all.get(i).getKey().of();
      for (int j = 0; j < i; j++) {
        if (box.intersects(shrunk(all.get(j).getValue()))) {
          faults.add("words of " + who + " over those of " + all.get(j).getKey().of());
        }
      }
      for (SchematicSymbol symbol : layout.symbols()) {
        boolean inside =
            symbol.kind() == SchematicSymbol.Kind.AMPLIFIER && who.equals(symbol.name());
        if (!inside && box.intersects(SchematicDrawing.scaled(symbol.body()))) {
          faults.add("words of " + who + " over " + symbol.name());
        }
      }
      for (Line2D wire : layout.wires()) {
        if (box.intersectsLine(
            new Line2D.Double(
                SchematicDrawing.scaled(wire.getP1()), SchematicDrawing.scaled(wire.getP2())))) {
          faults.add("words of " + who + " over a wire at " + wire.getP1() + " " + wire.getP2());
        }
      }
    }
    for (SchematicSymbol symbol : layout.symbols()) {
      for (Line2D wire : layout.wires()) {
        if (symbol.body().intersectsLine(wire)) {
          faults.add("a wire over " + symbol.name());
        }
      }
      for (SchematicSymbol other : layout.symbols()) {
        if (other != symbol && symbol.body().intersects(other.body())) {
          faults.add(symbol.name() + " over " + other.name());
        }
      }
    }
    assertThat(faults).as(name).isEmpty();
  }

  /** Half a point of the next line's ascenders may touch. */
  private static Rectangle2D shrunk(Rectangle2D box) {
    return new Rectangle2D.Double(
        box.getX() + 0.5, box.getY() + 0.5, box.getWidth() - 1, box.getHeight() - 1);
  }

  /** Terminals that the circuit joins are joined in the drawing, and no others. */
  private static void connects(Design design) {
    SchematicLayout layout = SchematicDrawing.of(design, "main").layout();
    SchematicNets nets = new SchematicNets(layout.symbols(), layout.wires(), layout.ports());
    Circuit circuit = Assembler.assemble(design, design.hookups().get(0)).circuit();
    Match match = new Match(design.name());
    for (SchematicPort port : layout.ports()) {
      match.port(nets.at(port.at()), node(circuit, port.node()));
    }
    Map<String, List<Integer>> terminals = terminals(circuit);
    Set<String> drawn = new HashSet<>();
    List<SchematicSymbol> unpoled = new ArrayList<>();
    for (SchematicSymbol symbol : layout.symbols()) {
      if (symbol.name().equals("generator")) {
        match.is(nets.at(symbol.terminals().get(0)), node(circuit, "generator"));
      } else {
        assertThat(drawn.add(symbol.name())).as("%s drawn twice", symbol.name()).isTrue();
        List<Integer> own = terminals.get(symbol.name());
        boolean poled = symbol.terminals().size() == 3 || isPoled(symbol);
        if (own == null) {
          assertThat(symbol.name()).startsWith("rails.");
        } else if (!poled) {
          unpoled.add(symbol);
        } else {
          for (int k = 0; k < own.size(); k++) {
            match.is(nets.at(symbol.terminals().get(k)), own.get(k));
          }
        }
      }
    }
    while (!unpoled.isEmpty()) {
      // Which end is which is told by the ends that are known already.
      SchematicSymbol next =
          unpoled.stream()
              .filter(
                  symbol ->
                      match.knows(nets.at(symbol.terminals().get(0)))
                          || match.knows(nets.at(symbol.terminals().get(1))))
              .findFirst()
              .orElseThrow();
      unpoled.remove(next);
      List<Integer> own = terminals.get(next.name());
      int first = nets.at(next.terminals().get(0));
      int second = nets.at(next.terminals().get(1));
      boolean straight =
          match.knows(first) ? match.node(first) == own.get(0) : match.node(second) == own.get(1);
      match.is(first, own.get(straight ? 0 : 1));
      match.is(second, own.get(straight ? 1 : 0));
    }
    for (String name : terminals.keySet()) {
      boolean apart = name.startsWith("stray.") || name.startsWith("leakage.");
      assertThat(apart || drawn.contains(name) || name.startsWith("rails.resistance"))
          .as("%s: %s is drawn", design.name(), name)
          .isTrue();
    }
    match.isWhole();
  }

  private static boolean isPoled(SchematicSymbol symbol) {
    return symbol.kind() == SchematicSymbol.Kind.DIODE
        || symbol.kind() == SchematicSymbol.Kind.CURRENT_SOURCE;
  }

  /** Which net of the drawing is which node of the circuit. */
  private static final class Match {
    private final String name;
    private final Map<Integer, Integer> nodeOf = new HashMap<>();
    private final Map<Integer, Set<Integer>> netsOf = new HashMap<>();
    private final Set<Integer> ported = new HashSet<>();

    Match(String name) {
      this.name = name;
    }

    void port(int net, int node) {
      ported.add(net);
      is(net, node);
    }

    void is(int net, int node) {
      Integer before = nodeOf.put(net, node);
      assertThat(before == null || before == node)
          .as("%s: net %s is both node %s and node %s", name, net, before, node)
          .isTrue();
      netsOf.computeIfAbsent(node, key -> new HashSet<>()).add(net);
    }

    boolean knows(int net) {
      return nodeOf.containsKey(net);
    }

    int node(int net) {
      return nodeOf.get(net);
    }

    /** A node that is drawn in several places has a port in all of them, or in all but one. */
    void isWhole() {
      netsOf.forEach(
          (node, places) -> {
            Set<Integer> bare = new HashSet<>(places);
            bare.removeAll(ported);
            boolean named = places.stream().anyMatch(ported::contains);
            assertThat(bare.size())
                .as("%s: node %s is drawn apart in %s", name, node, places)
                .isLessThanOrEqualTo(1);
            assertThat(places.size() == 1 || named).isTrue();
          });
    }
  }

  private static int node(Circuit circuit, String name) {
    return name.equals("ground") ? -1 : merged(circuit, circuit.node(name));
  }

  private static int merged(Circuit circuit, int index) {
    for (Element element : circuit.elements()) {
      if (element instanceof Lead lead && lead.to() == index) {
        return lead.from();
      }
    }
    return index;
  }

  private static Map<String, List<Integer>> terminals(Circuit circuit) {
    Map<String, List<Integer>> terminals = new HashMap<>();
    for (Element element : circuit.elements()) {
      int[] own = null;
      if (element instanceof Resistor resistor) {
        own = new int[] {resistor.from(), resistor.to()};
      } else if (element instanceof Capacitor capacitor) {
        own = new int[] {capacitor.from(), capacitor.to()};
      } else if (element instanceof BlockingCapacitor blocking) {
        own = new int[] {blocking.from(), blocking.to()};
      } else if (element instanceof CurrentSourceElement source) {
        own = new int[] {source.from(), source.to()};
      }
      if (own != null && !isInside(circuit, element.name())) {
        terminals.put(element.name(), List.of(merged(circuit, own[0]), merged(circuit, own[1])));
      }
    }
    for (DeviceTerminals device : circuit.devices()) {
      if (device instanceof DeviceTerminals.TransistorTerminals at) {
        terminals.put(
            device.role(),
            List.of(
                merged(circuit, at.collector()),
                merged(circuit, at.base()),
                merged(circuit, at.emitter())));
      } else if (device instanceof DeviceTerminals.DiodeTerminals at) {
        terminals.put(
            device.role(), List.of(merged(circuit, at.anode()), merged(circuit, at.cathode())));
      }
    }
    return terminals;
  }

  /** An ohmic resistance of a device, behind its terminal. */
  private static boolean isInside(Circuit circuit, String name) {
    return circuit.devices().stream()
        .anyMatch(device -> name.matches(device.role() + "\\.[a-zA-Z]+Resistance"));
  }

  private static void save(
      SchematicDrawing drawing, Optional<SchematicOverlay> overlay, String name)
      throws IOException {
    BufferedImage image =
        new BufferedImage(
            (int) Math.ceil(drawing.width()),
            (int) Math.ceil(drawing.height()),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    g2.setColor(Color.WHITE);
    g2.fillRect(0, 0, image.getWidth(), image.getHeight());
    g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    drawing.paint(g2, SchematicInk.PAPER, overlay);
    g2.dispose();
    Path folder = Files.createDirectories(Path.of("target", "pictures"));
    ImageIO.write(image, "png", folder.resolve(name + ".png").toFile());
  }
}
