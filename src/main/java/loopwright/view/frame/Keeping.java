package loopwright.view.frame;

import java.util.Map;
import loopwright.design.Design;
import loopwright.session.KeptWork;
import loopwright.session.Preferences;

/**
 * What the window keeps from one run to the next, and what it begins with.
 *
 * @param preferences recent files, look, size
 * @param work unsaved work
 * @param beginnings designs to begin with, by a short name, in the order of the menu
 */
public record Keeping(Preferences preferences, KeptWork work, Map<String, Design> beginnings) {}
