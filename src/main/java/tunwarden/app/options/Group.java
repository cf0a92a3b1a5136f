package tunwarden.app.options;

import java.util.List;

/** A command that is only a heading for commands of its own. */
public interface Group {
  /** Its commands, in the order the help lists them. */
  List<Entry> members();
}
