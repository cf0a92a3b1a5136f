package tunwarden.app.headless;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Proxy;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Runs a task on a signal where the system knows it. Reached by reflection, since the class is not
 * part of the standard library and may be absent.
 */
final class Signals {
  private static final Logger LOG = LoggerFactory.getLogger(Signals.class);

  private Signals() {}

  /** Runs the task, on a thread of its own, whenever the signal {@code TERM}, {@code INT} comes. */
  static void on(String name, Runnable task) {
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
}
