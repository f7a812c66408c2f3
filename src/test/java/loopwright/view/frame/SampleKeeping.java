package loopwright.view.frame;

import java.nio.file.Path;
import java.util.Map;
import loopwright.file.DesignFile;
import loopwright.file.Recovery;
import loopwright.file.UserFolder;
import loopwright.session.KeptWork;
import loopwright.session.Preferences;
import loopwright.session.Session;

/** Keeps work in a folder of the test's own. */
final class SampleKeeping {
  private SampleKeeping() {}

  static Keeping in(Path folder, Session session, DesignFile files) {
    UserFolder user = new UserFolder(folder);
    return new Keeping(
        new Preferences(user), new KeptWork(session, new Recovery(files, user)), Map.of());
  }
}
