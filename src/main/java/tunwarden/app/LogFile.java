package tunwarden.app;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.LoggerContext;
import ch.qos.logback.classic.encoder.PatternLayoutEncoder;
import ch.qos.logback.classic.spi.Configurator;
import ch.qos.logback.classic.spi.ConfiguratorRank;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.Appender;
import ch.qos.logback.core.AppenderBase;
import ch.qos.logback.core.Context;
import ch.qos.logback.core.rolling.RollingFileAppender;
import ch.qos.logback.core.rolling.SizeAndTimeBasedRollingPolicy;
import ch.qos.logback.core.spi.ContextAwareBase;
import ch.qos.logback.core.status.NopStatusListener;
import ch.qos.logback.core.util.FileSize;
import java.nio.file.Path;
import java.util.Map;
import org.slf4j.bridge.SLF4JBridgeHandler;

/**
 * The diagnostics log: one file under the user's state directory, rolled by day and size with a cap
 * on the total. Nothing is ever written to the terminal, where it would tear the screen. Found by
 * logback as a service; a {@code logback.xml} or {@code logback-test.xml} on the class path comes
 * first.
 */
@ConfiguratorRank(ConfiguratorRank.NOMINAL)
public final class LogFile extends ContextAwareBase implements Configurator {
  private static final int DAYS_KEPT = 30;
  private static final String PATTERN =
      "%d{yyyy-MM-dd'T'HH:mm:ss.SSSXXX} %-5level %logger{0} %msg%n";

  private final Path file;

  /** The log in the user's state directory. */
  public LogFile() {
    this(path());
  }

  LogFile(Path file) {
    this.file = file;
  }

  /** Where the diagnostics log is written. */
  public static Path path() {
    return directory(System.getenv(), System.getProperty("user.home", "."))
        .resolve("tunwarden.log");
  }

  /** Sends what libraries log through java.util.logging into the same file. */
  public static void captureLibraries() {
    SLF4JBridgeHandler.removeHandlersForRootLogger();
    SLF4JBridgeHandler.install();
  }

  /**
   * The state directory by the platform's custom.
   *
   * @param environment the process environment
   * @param home the user's home directory
   */
  static Path directory(Map<String, String> environment, String home) {
    String windows = environment.get("LOCALAPPDATA");
    if (windows != null && !windows.isBlank()) {
      return Path.of(windows, "Tunwarden");
    }
    String state = environment.get("XDG_STATE_HOME");
    boolean stated = state != null && !state.isBlank();
    return stated ? Path.of(state, "tunwarden") : Path.of(home, ".local", "state", "tunwarden");
  }

  @Override
  public ExecutionStatus configure(LoggerContext context) {
    // Without a listener logback prints its own warnings to standard output.
    context.getStatusManager().add(new NopStatusListener());
    Appender<ILoggingEvent> appender = new WhenNeeded();
    appender.setContext(context);
    appender.setName("file");
    appender.start();

    Logger root = context.getLogger(org.slf4j.Logger.ROOT_LOGGER_NAME);
    root.setLevel(Level.INFO);
    root.addAppender(appender);
    return ExecutionStatus.DO_NOT_INVOKE_NEXT_IF_ANY;
  }

  private RollingFileAppender<ILoggingEvent> opened(Context context) {
    PatternLayoutEncoder encoder = new PatternLayoutEncoder();
    encoder.setContext(context);
    encoder.setPattern(PATTERN);
    encoder.start();

    RollingFileAppender<ILoggingEvent> appender = new RollingFileAppender<>();
    appender.setContext(context);
    appender.setName("file");
    appender.setFile(file.toString());
    appender.setEncoder(encoder);
    SizeAndTimeBasedRollingPolicy<ILoggingEvent> rolling = new SizeAndTimeBasedRollingPolicy<>();
    rolling.setContext(context);
    rolling.setParent(appender);
    rolling.setFileNamePattern(file.resolveSibling("tunwarden-%d.%i.log").toString());
    rolling.setMaxFileSize(FileSize.valueOf("5MB"));
    rolling.setMaxHistory(DAYS_KEPT);
    rolling.setTotalSizeCap(FileSize.valueOf("50MB"));
    rolling.start();
    appender.setRollingPolicy(rolling);
    appender.start();
    return appender;
  }

  /** Opens the file with the first thing to write: that takes longer than most commands. */
  private final class WhenNeeded extends AppenderBase<ILoggingEvent> {
    private RollingFileAppender<ILoggingEvent> rolling;

    @Override
    protected void append(ILoggingEvent event) {
      if (rolling == null) {
        rolling = opened(getContext());
      }
      rolling.doAppend(event);
    }

    @Override
    public void stop() {
      super.stop();
      if (rolling != null) {
        rolling.stop();
      }
    }
  }
}
