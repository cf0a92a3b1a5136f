package tunwarden.replay.layout;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tunwarden.replay.text.Line;
import tunwarden.replay.text.LineSource;

/**
 * The head of a foreign log cut into fields: separator, names and a sample of rows.
 *
 * @param separator found between the fields
 * @param names of the columns; {@code column 1} and so on where the file has no line of names
 * @param units second line of names holding units; empty texts where there is none
 * @param headerLine line of the names; 0 for none
 * @param rows sampled rows of data
 * @param firstRow line of the first row of data
 */
record Table(
    char separator,
    List<String> names,
    List<String> units,
    long headerLine,
    List<List<String>> rows,
    long firstRow) {
  /** Rare separators first: commas also occur inside numbers. */
  private static final char[] SEPARATORS = {'\t', ';', '|', ','};

  /** A line cut into fields. */
  private record Cut(long number, List<String> fields, boolean comment) {}

  /**
   * Finds the table.
   *
   * @param counts whether the user says that times are plain numbers, so that any two numbers in a
   *     line make a row
   */
  static Table find(List<SampledLine> head, boolean counts) throws LayoutException {
    char best = 0;
    int bestRows = 0;
    for (char separator : SEPARATORS) {
      int rows = dataRows(cut(head, separator), counts).size();
      if (rows > bestRows) {
        best = separator;
        bestRows = rows;
      }
    }
    if (best == 0) {
      throw noTable(head);
    }
    List<Cut> cuts = cut(head, best);
    return assemble(best, cuts, dataRows(cuts, counts));
  }

  private static LayoutException noTable(List<SampledLine> head) {
    for (SampledLine line : head) {
      boolean separated = line.text().chars().anyMatch(c -> c == ',' || c == ';' || c == '\t');
      if (!line.isBlank() && !line.isComment()) {
        return new LayoutException(
            line.number(),
            "",
            separated
                ? "no row below this line holds a time and a number; a log needs a column of times"
                    + " (such as 2026-03-02T08:00:00Z) and one of pressures"
                : "only one column is found here; a log needs a time and a pressure, separated by"
                    + " commas, semicolons or tabs");
      }
    }
    return new LayoutException(0, "", "the file holds no line of names and no rows");
  }

  private static List<Cut> cut(List<SampledLine> head, char separator) {
    List<Cut> cuts = new ArrayList<>();
    for (SampledLine sampled : head) {
      if (sampled.isBlank()) {
        continue;
      }
      String text = sampled.isComment() ? sampled.text().substring(1) : sampled.text();
      cuts.add(new Cut(sampled.number(), fields(text, separator), sampled.isComment()));
    }
    return cuts;
  }

  static List<String> fields(String text, char separator) {
    List<String> fields = new ArrayList<>();
    Line line = new Line();
    try (LineSource source = new LineSource(new java.io.StringReader(text))) {
      if (source.next(line) && line.split(separator)) {
        for (int i = 0; i < line.fields(); i++) {
          fields.add(line.field(i));
        }
      }
    } catch (java.io.IOException impossible) {
      throw new IllegalStateException(impossible);
    }
    return fields;
  }

  /** Lines that hold a time and a number, of the commonest width among those. */
  private static List<Cut> dataRows(List<Cut> cuts, boolean counts) {
    Map<Integer, List<Cut>> byWidth = new HashMap<>();
    for (Cut cut : cuts) {
      long times = cut.fields().stream().filter(TimeGuess::looksLikeTime).count();
      long numbers = cut.fields().stream().filter(NumberGuess::looksLikeNumber).count();
      boolean row = counts ? numbers > 1 : times > 0 && numbers > 0;
      if (!cut.comment() && row && cut.fields().size() > 1) {
        byWidth.computeIfAbsent(cut.fields().size(), w -> new ArrayList<>()).add(cut);
      }
    }
    return byWidth.values().stream()
        .max(java.util.Comparator.comparingInt(List::size))
        .orElse(List.of());
  }

  private static Table assemble(char separator, List<Cut> cuts, List<Cut> data)
      throws LayoutException {
    Cut first = data.get(0);
    int width = first.fields().size();
    Cut header = null;
    Cut units = null;
    for (Cut cut : cuts) {
      if (cut.number() >= first.number()) {
        break;
      }
      if (cut.fields().size() == width && isWords(cut)) {
        units = header != null && isUnits(cut) ? cut : null;
        header = units == null ? cut : header;
      } else if (cut.fields().size() > 1 && !cut.comment() && isWords(cut)) {
        refuseOtherWidth(separator, cut, width);
      }
    }
    List<String> names = header == null ? numbered(width) : header.fields();
    List<String> unitTexts =
        units == null ? java.util.Collections.nCopies(width, "") : units.fields();
    List<List<String>> rows = data.stream().map(Cut::fields).toList();
    long headerLine = header == null ? 0 : header.number();
    return new Table(separator, names, unitTexts, headerLine, rows, first.number());
  }

  /** Three names over five fields with commas: the comma is doing two jobs. */
  private static void refuseOtherWidth(char separator, Cut cut, int width) throws LayoutException {
    boolean namesTime = cut.fields().stream().anyMatch(RoleWords::isTime);
    if (separator == ',' && namesTime && width == 2 * cut.fields().size() - 1) {
      throw new LayoutException(
          cut.number(),
          "",
          "the rows below have more fields than this line has names, since the comma is both the"
              + " separator and the decimal sign; export with semicolons or with decimal points");
    }
  }

  private static boolean isWords(Cut cut) {
    return cut.fields().stream().noneMatch(NumberGuess::looksLikeNumber)
        && cut.fields().stream().anyMatch(field -> !field.isEmpty());
  }

  private static boolean isUnits(Cut cut) {
    boolean any = false;
    for (String field : cut.fields()) {
      String bare = HeaderText.bare(field);
      boolean unit = HeaderText.anyUnit(bare);
      any |= unit;
      if (!unit && !bare.isEmpty() && !RoleWords.isFiller(bare)) {
        return false;
      }
    }
    return any;
  }

  private static List<String> numbered(int width) {
    List<String> names = new ArrayList<>();
    for (int i = 1; i <= width; i++) {
      names.add("column " + i);
    }
    return names;
  }

  int width() {
    return names.size();
  }

  /** The column with that header, or -1. */
  int indexOf(String name) {
    int exact = names.indexOf(name);
    if (exact >= 0) {
      return exact;
    }
    for (int i = 0; i < names.size(); i++) {
      if (names.get(i).equalsIgnoreCase(name)
          || new HeaderText(names.get(i)).name().equalsIgnoreCase(name)) {
        return i;
      }
    }
    return -1;
  }

  /** The cells of a column, blanks left out. */
  List<String> cells(int column) {
    List<String> cells = new ArrayList<>();
    for (List<String> row : rows) {
      if (column < row.size() && !row.get(column).isEmpty()) {
        cells.add(row.get(column));
      }
    }
    return cells;
  }

  String namesInWords() {
    return "'" + String.join("', '", names) + "'";
  }

  /** For sentences. */
  String separatorInWords() {
    return switch (separator) {
      case '\t' -> "tabs";
      case ';' -> "semicolons";
      case '|' -> "bars";
      default -> "commas";
    };
  }
}
