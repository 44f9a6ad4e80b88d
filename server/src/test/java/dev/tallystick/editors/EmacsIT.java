package dev.tallystick.editors;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A real Emacs with eglot and the packaged server, in a terminal as a translator would have it. */
class EmacsIT {
  @TempDir Path folder;

  @Test
  void findingsFollowInThreeLanguagesWithTheSetUpOfTheReadme() throws Exception {
    KiteSession session = KiteSession.in(folder);
    String load =
        "(condition-case nil (load (concat (getenv \"SCRIPTS\") \"/kites.el\") nil t t) (error (kill-emacs 2)))";
    String terminal = "stty rows 60 columns 160; exec emacs -nw -q --eval '" + load + "'";
    session.run("elisp", List.of("script", "-qec", terminal, "/dev/null"));
    session.assertPositions();
    session.assertTexts();
  }
}
