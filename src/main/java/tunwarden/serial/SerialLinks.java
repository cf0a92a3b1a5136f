package tunwarden.serial;

import com.fazecast.jSerialComm.SerialPort;
import com.fazecast.jSerialComm.SerialPortInvalidPortException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.Locale;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.wire.profile.LineSettings;

/**
 * Serial ports of this machine through jSerialComm. No listeners of that library are used: after an
 * unplug they spin, and one that throws ends the port's thread unseen.
 */
public final class SerialLinks implements ByteLinkFactory {
  private static final Logger LOG = LoggerFactory.getLogger(SerialLinks.class);
  private static final int LISTEN_MS = 100;
  private static final int LINUX_BUSY = 16;

  static {
    // Keeps the unpacked native library apart from that of other programs.
    if (System.getProperty("fazecast.jSerialComm.appid") == null) {
      System.setProperty("fazecast.jSerialComm.appid", "tunwarden");
    }
  }

  /**
   * Loads the native library now. It makes the process ignore SIGHUP, so whoever wants that signal
   * must ask for it after this.
   */
  public static void load() {
    try {
      LOG.debug("serial library {}", SerialPort.getVersion());
    } catch (LinkageError none) {
      LOG.error("serial ports cannot be used on this machine: {}", none.toString());
    }
  }

  @Override
  public ByteLink open(String port, LineSettings settings, Use use) throws PortException {
    SerialPort serial;
    try {
      serial = SerialPort.getCommPort(port);
    } catch (SerialPortInvalidPortException e) {
      throw new PortException(
          PortException.Reason.ABSENT,
          "there is no serial port " + port + "; see 'instruments ports' for those there are");
    }
    prepare(serial, isPseudoTerminal(port) ? plain(settings) : settings, use);
    if (!serial.openPort(0)) {
      throw refused(port, errorCode(port, serial.getLastErrorCode()));
    }
    return new SerialLink(port, serial, use);
  }

  @Override
  public String behind(String port) {
    try {
      Path node = Path.of(port).toRealPath();
      Object key = Files.readAttributes(node, BasicFileAttributes.class).fileKey();
      return node + " " + key;
    } catch (IOException | InvalidPathException e) {
      return isWindows() ? port : "";
    }
  }

  /** Where a rehearsal speaks. It has no parity, and the C library calls asking for it an error. */
  private static boolean isPseudoTerminal(String port) {
    try {
      return Path.of(port).toRealPath().startsWith("/dev/pts");
    } catch (IOException | InvalidPathException e) {
      return false;
    }
  }

  private static boolean isWindows() {
    return System.getProperty("os.name").toLowerCase(Locale.ROOT).startsWith("windows");
  }

  private static LineSettings plain(LineSettings settings) {
    LineSettings usual = LineSettings.USUAL;
    return new LineSettings(
        settings.baud(),
        usual.dataBits(),
        usual.parity(),
        usual.stopBits(),
        usual.flow(),
        settings.wires(),
        settings.settle());
  }

  private static void prepare(SerialPort serial, LineSettings settings, Use use) {
    serial.setComPortParameters(
        settings.baud(),
        settings.dataBits(),
        settings.stopBits() == 2 ? SerialPort.TWO_STOP_BITS : SerialPort.ONE_STOP_BIT,
        parity(settings),
        settings.wires().rs485() == LineSettings.Rs485.ON);
    serial.setFlowControl(flow(settings));
    if (settings.wires().rs485() == LineSettings.Rs485.LEAVE) {
      serial.disableRs485ModeControl();
    }
    if (!settings.wires().dtr()) {
      serial.clearDTR();
      serial.clearRTS();
    }
    if (use == Use.LISTEN) {
      serial.setComPortTimeouts(SerialPort.TIMEOUT_READ_SEMI_BLOCKING, LISTEN_MS, 0);
    } else {
      serial.setComPortTimeouts(SerialPort.TIMEOUT_NONBLOCKING, 0, 0);
    }
  }

  private static int parity(LineSettings settings) {
    return switch (settings.parity()) {
      case NONE -> SerialPort.NO_PARITY;
      case EVEN -> SerialPort.EVEN_PARITY;
      case ODD -> SerialPort.ODD_PARITY;
    };
  }

  private static int flow(LineSettings settings) {
    return switch (settings.flow()) {
      case NONE -> SerialPort.FLOW_CONTROL_DISABLED;
      case RTS_CTS -> SerialPort.FLOW_CONTROL_RTS_ENABLED | SerialPort.FLOW_CONTROL_CTS_ENABLED;
      case XON_XOFF ->
          SerialPort.FLOW_CONTROL_XONXOFF_IN_ENABLED | SerialPort.FLOW_CONTROL_XONXOFF_OUT_ENABLED;
    };
  }

  /** A port that another program has locked comes back as absent although its name is there. */
  private static int errorCode(String port, int code) {
    boolean there = !isWindows() && Files.exists(Path.of(port));
    return there && unixReason(code) == PortException.Reason.ABSENT ? LINUX_BUSY : code;
  }

  /** The sentence for an error code of the operating system met while opening. */
  static PortException refused(String port, int code) {
    PortException.Reason reason = isWindows() ? windowsReason(code) : unixReason(code);
    String sentence =
        switch (reason) {
          case ABSENT ->
              "there is no serial port " + port + "; see 'instruments ports' for those there are";
          case DENIED ->
              port
                  + " may not be opened by this user; add the user to the group that owns it"
                  + " (dialout or uucp) and log in again";
          case BUSY -> port + " is held by another program; close that program";
          default ->
              port + " is not a usable serial port at these settings (system error " + code + ")";
        };
    return new PortException(reason, sentence);
  }

  /** Error numbers of Linux: ENOENT, ENXIO, ENODEV; EACCES, EPERM; EBUSY, EAGAIN (lock held). */
  private static PortException.Reason unixReason(int code) {
    return switch (code) {
      case 2, 6, 19 -> PortException.Reason.ABSENT;
      case 1, 13 -> PortException.Reason.DENIED;
      case 11, 16 -> PortException.Reason.BUSY;
      default -> PortException.Reason.REFUSED;
    };
  }

  /** ERROR_FILE_NOT_FOUND, ERROR_PATH_NOT_FOUND; ERROR_ACCESS_DENIED is what a held port gives. */
  private static PortException.Reason windowsReason(int code) {
    return switch (code) {
      case 2, 3 -> PortException.Reason.ABSENT;
      case 5, 32 -> PortException.Reason.BUSY;
      default -> PortException.Reason.REFUSED;
    };
  }
}
