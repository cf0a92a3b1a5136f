package tunwarden.app;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.FilterWriter;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Map;

/**
 * Standard output and error as text. A terminal that does not speak UTF-8 gets plain ASCII instead
 * of question marks.
 */
final class Streams {
  private static final Map<Character, String> PLAIN =
      Map.of(
          '°', "", '±', "+/-", '–', "-", '³', "3", 'µ', "u", '·', "*", '×', "x", '²', "2", '→',
          "->");

  private Streams() {}

  static PrintWriter standardOut() {
    return writer(FileDescriptor.out);
  }

  static PrintWriter standardErr() {
    return writer(FileDescriptor.err);
  }

  /** Whether standard output goes to something that shows more than ASCII. */
  static boolean isUnicode() {
    return charset(System.getenv(), systemCharset()).newEncoder().canEncode('±');
  }

  private static PrintWriter writer(FileDescriptor descriptor) {
    Charset charset = charset(System.getenv(), systemCharset());
    Writer bytes = new OutputStreamWriter(new FileOutputStream(descriptor), charset);
    boolean unicode = charset.newEncoder().canEncode('±');
    return new PrintWriter(unicode ? bytes : new Folding(bytes));
  }

  private static String systemCharset() {
    return System.getProperty("stdout.encoding", System.getProperty("native.encoding", ""));
  }

  /**
   * The charset a terminal expects: what the locale variables say, else the system's own, else
   * ASCII.
   *
   * @param environment the process environment
   * @param systemCharset what the system itself names, or empty
   */
  static Charset charset(Map<String, String> environment, String systemCharset) {
    for (String name : new String[] {"LC_ALL", "LC_CTYPE", "LANG"}) {
      String value = environment.getOrDefault(name, "").toLowerCase(Locale.ROOT);
      if (!value.isEmpty()) {
        boolean utf8 = value.endsWith("utf-8") || value.endsWith("utf8");
        return utf8 ? StandardCharsets.UTF_8 : StandardCharsets.US_ASCII;
      }
    }
    boolean known = !systemCharset.isEmpty() && Charset.isSupported(systemCharset);
    return known ? Charset.forName(systemCharset) : StandardCharsets.US_ASCII;
  }

  /** Writes the few signs outside ASCII that the program uses in letters that any terminal has. */
  static final class Folding extends FilterWriter {
    Folding(Writer out) {
      super(out);
    }

    @Override
    public void write(int c) throws IOException {
      String plain = PLAIN.get((char) c);
      if (plain == null) {
        out.write(c);
      } else {
        out.write(plain);
      }
    }

    @Override
    public void write(char[] text, int offset, int length) throws IOException {
      for (int i = 0; i < length; i++) {
        write(text[offset + i]);
      }
    }

    @Override
    public void write(String text, int offset, int length) throws IOException {
      write(text.toCharArray(), offset, length);
    }
  }
}
