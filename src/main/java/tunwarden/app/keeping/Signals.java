package tunwarden.app.keeping;

import com.sun.jna.Library;
import com.sun.jna.Native;
import com.sun.jna.Platform;
import com.sun.jna.Pointer;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Proxy;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Runs a task on a signal where the system knows it. Reached by reflection, since the class is not
 * part of the standard library and may be absent.
 */
public final class Signals {
  private static final Logger LOG = LoggerFactory.getLogger(Signals.class);

  /** Its number on every Unix. */
  private static final int SIGHUP = 1;

  private Signals() {}

  /** The one C function that is needed. */
  interface C extends Library {
    /** Sets what a signal does; a null pointer is the system's own way. */
    Pointer signal(int number, Pointer handler);
  }

  /** Runs the task, on a thread of its own, whenever the signal {@code TERM}, {@code INT} comes. */
  public static void on(String name, Runnable task) {
    try {
      Class<?> signal = Class.forName("sun.misc.Signal");
      Class<?> handler = Class.forName("sun.misc.SignalHandler");
      Object wanted = signal.getConstructor(String.class).newInstance(name);
      Object doer =
          Proxy.newProxyInstance(
              Signals.class.getClassLoader(),
              new Class<?>[] {handler},
              (proxy, method, arguments) -> {
                if (method.getName().equals("handle")) {
                  task.run();
                }
                return null;
              });
      signal.getMethod("handle", signal, handler).invoke(null, wanted, doer);
    } catch (ReflectiveOperationException | IllegalArgumentException absent) {
      Throwable cause =
          absent instanceof InvocationTargetException e ? e.getTargetException() : absent;
      LOG.info("SIG{} is not listened to here: {}", name, cause.toString());
    }
  }

  /**
   * Runs the task on SIGHUP, for a process that has loaded the serial library: that makes the
   * process ignore the signal, and the virtual machine takes no handler for a signal that is
   * ignored. So the signal is set back first.
   */
  public static void onHangUp(Runnable task) {
    if (Platform.isWindows()) {
      return;
    }
    try {
      Native.load("c", C.class).signal(SIGHUP, Pointer.NULL);
      on("HUP", task);
    } catch (LinkageError none) {
      LOG.info("SIGHUP is not listened to here: {}", none.toString());
    }
  }
}
