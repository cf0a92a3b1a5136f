package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.ghgande.j2mod.modbus.procimg.SimpleInputRegister;
import com.ghgande.j2mod.modbus.procimg.SimpleProcessImage;
import com.ghgande.j2mod.modbus.procimg.SimpleRegister;
import com.ghgande.j2mod.modbus.slave.ModbusSlave;
import com.ghgande.j2mod.modbus.slave.ModbusSlaveFactory;
import com.ghgande.j2mod.modbus.util.SerialParameters;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.config.profile.ProfileReader;
import tunwarden.config.profile.Profiles;
import tunwarden.pty.PtyCable;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Profile;

/** The master against slaves written by others, each on its own serial port. */
class ModbusPeersTest {
  private static final int UNIT = 5;
  private static final Duration SOON = Duration.ofSeconds(10);
  private static final float PRESSURE = 0.873f;
  private static final float TEMPERATURE = 5.25f;

  private static final Profile FLOAT = Profiles.find("modbus-rtu-float", Path.of(""));
  private static final Profile SCALED = scaled();

  @TempDir private Path near;
  @TempDir private Path far;

  /**
   * Whole numbers in mbar and hundredths of a degree, on the line settings of the float profile.
   */
  private static Profile scaled() {
    String text = Profiles.shippedText("modbus-rtu-scaled").replace("9600", "19200");
    return ProfileReader.read(text, "scaled");
  }

  private void readsBothWays(PtyCable cable) {
    List<Binding> bindings = new ArrayList<>(Watching.unit(FLOAT, UNIT));
    Watching.unit(SCALED, UNIT)
        .forEach(
            b ->
                bindings.add(
                    new Binding(
                        "whole", b.quantity(), b.profile(), b.field(), b.slave(), b.trim())));
    try (Watching watching = new Watching(cable.near(), bindings)) {
      for (String vessel : List.of("unit5", "whole")) {
        Eventually.within(
            SOON,
            "readings of " + vessel + ": " + watching.health(),
            () -> watching.readings(r -> r.vessel().equals(vessel)).size() >= 4);
        double pascal = pressures(watching, vessel).get(0);
        assertEquals(PRESSURE * 1e5, pascal, 0.01);
      }
      watching
          .readings(r -> r.quantity() == Quantity.TEMPERATURE)
          .forEach(r -> assertEquals(TEMPERATURE + 273.15, r.value(), 1e-4));
    }
  }

  private static List<Double> pressures(Watching watching, String vessel) {
    return watching
        .readings(r -> r.vessel().equals(vessel) && r.quantity() == Quantity.PRESSURE)
        .stream()
        .map(r -> r.value())
        .toList();
  }

  private static void saysIllegalAddress(PtyCable cable) {
    String text =
        Profiles.shippedText("modbus-rtu-float").replace("\"address\": 0", "\"address\": 5000");
    Profile beyond = ProfileReader.read(text.replace("\"address\": 2", "\"address\": 5002"), "b");
    try (Watching watching = new Watching(cable.near(), Watching.unit(beyond, UNIT))) {
      Eventually.within(SOON, "a refusal", () -> !watching.faults().isEmpty());
      assertEquals(Quality.UNREADABLE, watching.faults().get(0).quality());
      assertEquals("unit 5: illegal data address", watching.faults().get(0).detail());
    }
  }

  @Test
  void j2mod() throws Exception {
    try (PtyCable cable = new PtyCable(near, far)) {
      SimpleProcessImage image = new SimpleProcessImage(UNIT);
      for (float value : new float[] {PRESSURE, TEMPERATURE}) {
        int bits = Float.floatToIntBits(value);
        image.addRegister(new SimpleRegister(bits >>> 16));
        image.addRegister(new SimpleRegister(bits & 0xFFFF));
      }
      image.addInputRegister(new SimpleInputRegister(873));
      image.addInputRegister(new SimpleInputRegister(525));
      SerialParameters parameters = new SerialParameters();
      parameters.setPortName(cable.far());
      parameters.setBaudRate(19200);
      parameters.setEncoding("rtu");
      ModbusSlave slave = ModbusSlaveFactory.createSerialSlave(parameters);
      slave.addProcessImage(UNIT, image);
      slave.open();
      try {
        readsBothWays(cable);
        saysIllegalAddress(cable);
      } finally {
        ModbusSlaveFactory.close();
      }
    }
  }

  @Test
  void pymodbus() throws Exception {
    String python =
        python()
            .orElseGet(
                () -> {
                  Assumptions.abort("skipped: python3 with pymodbus and pyserial is not installed");
                  return "";
                });
    try (PtyCable cable = new PtyCable(near, far)) {
      Path script = near.resolve("modbus_slave.py");
      Files.copy(ModbusPeersTest.class.getResourceAsStream("/peers/modbus_slave.py"), script);
      Process peer =
          new ProcessBuilder(python, script.toString(), cable.far())
              .redirectError(near.resolve("peer.err").toFile())
              .start();
      try {
        waitUntilReady(peer, near.resolve("peer.err"));
        readsBothWays(cable);
        saysIllegalAddress(cable);
      } finally {
        peer.destroyForcibly().waitFor();
      }
    }
  }

  private static void waitUntilReady(Process peer, Path errors) throws IOException {
    BufferedReader reader = new BufferedReader(new InputStreamReader(peer.getInputStream()));
    String line = reader.readLine();
    assertTrue("ready".equals(line), () -> line + read(errors));
    Eventually.sleep(300);
  }

  private static String read(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      return e.toString();
    }
  }

  private static Optional<String> python() throws Exception {
    for (String candidate : List.of("python3", "/usr/bin/python3")) {
      try {
        Process check =
            new ProcessBuilder(candidate, "-c", "import pymodbus, serial")
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
        if (check.waitFor() == 0) {
          return Optional.of(candidate);
        }
      } catch (IOException e) {
        continue;
      }
    }
    return Optional.empty();
  }
}
