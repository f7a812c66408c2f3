package loopwright.command;

import java.util.List;
import java.util.function.Function;
import loopwright.check.Finding;
import loopwright.file.DesignFile;
import loopwright.predict.Prediction;

/**
 * What the sub-commands work with.
 *
 * @param designs reads design files
 * @param predictions solves them
 * @param findings says what is wrong or risky in a prediction
 */
public record CommandServices(
    DesignFile designs,
    PredictionSource predictions,
    Function<Prediction, List<Finding>> findings) {}
