package tunwarden.app.board;

import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Locale;
import java.util.Properties;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Theme;
import tunwarden.units.Display;

/** Remembers units, theme and glyphs from one start to the next. Losing them harms nobody. */
public final class LookFile {
  private static final Logger LOG = LoggerFactory.getLogger(LookFile.class);

  private final Path file;

  /** Kept in the given state directory. */
  public LookFile(Path stateDirectory) {
    this.file = stateDirectory.resolve("look.properties");
  }

  /** What was chosen last, or the usual look where nothing readable was kept. */
  public Look load() {
    Properties kept = new Properties();
    if (Files.isRegularFile(file)) {
      try (Reader reader = Files.newBufferedReader(file)) {
        kept.load(reader);
      } catch (IOException | IllegalArgumentException e) {
        LOG.warn("{} could not be read", file, e);
      }
    }
    return new Look(
        units(kept.getProperty("units", "")),
        choice(Theme.class, kept.getProperty("theme"), Look.USUAL.theme()),
        choice(Glyphs.class, kept.getProperty("glyphs"), Look.USUAL.glyphs()));
  }

  /** Keeps a choice; written beside and renamed, so that a crash leaves the old one. */
  public void keep(Look look) {
    Properties kept = new Properties();
    kept.setProperty("units", word(look.units()));
    kept.setProperty("theme", look.theme().name().toLowerCase(Locale.ROOT));
    kept.setProperty("glyphs", look.glyphs().name().toLowerCase(Locale.ROOT));
    Path beside = file.resolveSibling(file.getFileName() + ".new");
    try {
      Files.createDirectories(file.getParent());
      try (Writer writer = Files.newBufferedWriter(beside)) {
        kept.store(writer, null);
      }
      Files.move(beside, file, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException e) {
      LOG.warn("{} could not be written", file, e);
    }
  }

  private static String word(Display units) {
    if (units.equals(Display.US)) {
      return "us";
    }
    return units.equals(Display.SI) ? "si" : "metric";
  }

  private static Display units(String word) {
    return switch (word) {
      case "us" -> Display.US;
      case "si" -> Display.SI;
      default -> Display.METRIC;
    };
  }

  private static <E extends Enum<E>> E choice(Class<E> type, String word, E usual) {
    if (word == null) {
      return usual;
    }
    try {
      return Enum.valueOf(type, word.toUpperCase(Locale.ROOT));
    } catch (IllegalArgumentException unknown) {
      return usual;
    }
  }
}
