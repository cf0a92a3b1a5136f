package tunwarden.app.headless;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Proxy;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Runs a task on SIGHUP where the system knows that signal. Reached by reflection, since the class
 * is not part of the standard library and may be absent.
 */
final class HangUp {
  private static final Logger LOG = LoggerFactory.getLogger(HangUp.class);

  private HangUp() {}

  static void onSignal(Runnable task) {
    try {
      Class<?> signal = Class.forName("sun.misc.Signal");
      Class<?> handler = Class.forName("sun.misc.SignalHandler");
      Object hangUp = signal.getConstructor(String.class).newInstance("HUP");
      Object doer =
          Proxy.newProxyInstance(
              HangUp.class.getClassLoader(),
              new Class<?>[] {handler},
              (proxy, method, arguments) -> {
                if (method.getName().equals("handle")) {
                  task.run();
                }
                return null;
              });
      signal.getMethod("handle", signal, handler).invoke(null, hangUp, doer);
    } catch (ReflectiveOperationException | IllegalArgumentException absent) {
      Throwable cause =
          absent instanceof InvocationTargetException e ? e.getTargetException() : absent;
      LOG.info("no reload on SIGHUP here: {}", cause.toString());
    }
  }
}
