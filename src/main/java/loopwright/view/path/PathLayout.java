package loopwright.view.path;

import java.awt.Rectangle;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import loopwright.view.path.SignalPath.Way;

/**
 * Where everything stands at a size. All measures of the drawing are those of a panel of 1000 by
 * 222 pixels, times one scale.
 */
final class PathLayout {
  private static final double NORMAL_WIDTH = 1000;
  private static final double NORMAL_HEIGHT = 222;
  private static final double LEAST_SCALE = 0.75;
  private static final double GREATEST_SCALE = 1.7;

  private static final double MARGIN = 8;
  private static final double GAP = 80;
  private static final double BLOCK_HEIGHT = 118;
  private static final double HANGING_HEIGHT = 58;
  private static final double LANE_HEIGHT = 26;

  /** The amplifier of kind figures is wider than a stage by this factor. */
  private static final double WHOLE_AMPLIFIER = 1.7;

  /** From the line by which the feedback comes up to the edge of the pair. */
  private static final double RETURN = 14;

  /** From the edge of the last stage to the point at which the feedback leaves. */
  private static final double TAP = 9;

  /** Height of the wires behind the input, as a share of a block's height. */
  static final double SIGNAL = 0.4;

  private static final double PLUS = 0.27;
  private static final double MINUS = 0.75;

  private final SignalPath path;
  private final double scale;
  private final Map<String, Rectangle> bounds = new LinkedHashMap<>();
  private final int laneMiddle;

  /**
   * @param width of the panel, in pixels
   * @param height of the panel, in pixels
   */
  PathLayout(SignalPath path, int width, int height) {
    this.path = path;
    double wanted = Math.min(width / NORMAL_WIDTH, height / NORMAL_HEIGHT);
    this.scale = Math.max(LEAST_SCALE, Math.min(GREATEST_SCALE, wanted));
    int spare = Math.max(0, height - pixels(NORMAL_HEIGHT));
    int top = pixels(MARGIN) + spare / 3;
    int blockHeight = pixels(BLOCK_HEIGHT);
    placeRow(width, top, blockHeight);
    int below = top + blockHeight;
    for (Map.Entry<String, Block> entry : path.hanging().entrySet()) {
      Rectangle stage = bounds.get(entry.getKey());
      bounds.put(
          entry.getValue().id(),
          new Rectangle(
              stage.x + pixels(10), below, stage.width + pixels(74), pixels(HANGING_HEIGHT)));
    }
    this.laneMiddle = below + pixels(HANGING_HEIGHT + 4 + LANE_HEIGHT / 2) + spare / 3;
  }

  private void placeRow(int width, int top, int blockHeight) {
    List<Block> row = path.row();
    double gaps = (row.size() - 1) * GAP * scale;
    double weights = row.stream().mapToDouble(PathLayout::weight).sum();
    double unit = (width - 2 * MARGIN * scale - gaps) / weights;
    double x = MARGIN * scale;
    for (Block block : row) {
      double blockWidth = Math.max(unit * weight(block), 40);
      bounds.put(
          block.id(),
          new Rectangle((int) Math.round(x), top, (int) Math.round(blockWidth), blockHeight));
      x += blockWidth + GAP * scale;
    }
  }

  private static double weight(Block block) {
    return block.id().equals(BlockIds.AMPLIFIER) ? WHOLE_AMPLIFIER : 1;
  }

  /** Pixels for a measure at normal size. */
  int pixels(double measure) {
    return (int) Math.round(measure * scale);
  }

  /** Size of everything against a panel of normal size. */
  double scale() {
    return scale;
  }

  /** Where the block of a name stands; not the feedback, whose width its words decide. */
  Rectangle bounds(String id) {
    return bounds.get(id);
  }

  /** Where the feedback's words stand. */
  Rectangle feedback(int textWidth) {
    int from = returnX();
    int to = tapX();
    int room = to - from - pixels(30);
    int width = Math.max(pixels(60), Math.min(room, textWidth + pixels(28)));
    int height = pixels(LANE_HEIGHT);
    return new Rectangle((from + to - width) / 2, laneMiddle - height / 2, width, height);
  }

  /** The block that the inputs belong to. */
  Rectangle amplifierInput() {
    return bounds.get(path.row().get(1).id());
  }

  /** The last block of the amplifier. */
  Rectangle amplifierOutput() {
    return bounds.get(path.row().get(path.row().size() - 2).id());
  }

  /** Height of the non-inverting input. */
  int plusY() {
    return at(amplifierInput(), PLUS);
  }

  /** Height of the inverting input. */
  int minusY() {
    return at(amplifierInput(), MINUS);
  }

  /** Height of the input that the source drives. */
  int drivenY() {
    return path.route().way() == Way.INVERTING ? minusY() : plusY();
  }

  /** Height of the input that the source does not drive. */
  int otherY() {
    return path.route().way() == Way.INVERTING ? plusY() : minusY();
  }

  /** Height of the wires behind the amplifier's input. */
  int signalY() {
    return at(amplifierInput(), SIGNAL);
  }

  /** Where the feedback comes up to the inverting input. */
  int returnX() {
    return amplifierInput().x - pixels(RETURN);
  }

  /** Where the feedback leaves the output. */
  int tapX() {
    Rectangle load = bounds.get(BlockIds.LOAD);
    Rectangle output = amplifierOutput();
    return path.route().fromLoad()
        ? load.x + load.width / 2
        : output.x + output.width + pixels(TAP);
  }

  /** Height of the way back. */
  int laneY() {
    return laneMiddle;
  }

  private static int at(Rectangle block, double share) {
    return block.y + (int) Math.round(block.height * share);
  }
}
