package loopwright.view.study;

import java.util.function.Consumer;
import java.util.function.Supplier;
import loopwright.session.Edit;
import loopwright.session.Snapshot;
import loopwright.task.TaskRunner;

/**
 * What every study needs of the window.
 *
 * @param now the present moment
 * @param edit makes an edit
 * @param runners a runner of its own for each study
 */
public record Desk(Supplier<Snapshot> now, Consumer<Edit> edit, Supplier<TaskRunner> runners) {}
