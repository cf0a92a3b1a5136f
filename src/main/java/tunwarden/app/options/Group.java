package tunwarden.app.options;

import java.util.List;

/** A command that is only a heading for commands of its own. */
public interface Group {
  /** The classes of its commands, in the order the help lists them. */
  List<Class<?>> members();
}
