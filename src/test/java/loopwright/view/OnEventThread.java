package loopwright.view;

import java.awt.EventQueue;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import org.junit.jupiter.api.extension.ExtensionContext;
import org.junit.jupiter.api.extension.InvocationInterceptor;
import org.junit.jupiter.api.extension.ReflectiveInvocationContext;

/** Runs the tests of a class on the event thread, where alone components may be touched. */
public final class OnEventThread implements InvocationInterceptor {
  @Override
  public void interceptTestMethod(
      Invocation<Void> invocation,
      ReflectiveInvocationContext<Method> method,
      ExtensionContext context)
      throws Throwable {
    run(invocation);
  }

  @Override
  public void interceptTestTemplateMethod(
      Invocation<Void> invocation,
      ReflectiveInvocationContext<Method> method,
      ExtensionContext context)
      throws Throwable {
    run(invocation);
  }

  private static void run(Invocation<Void> invocation) throws Throwable {
    Throwable[] thrown = new Throwable[1];
    try {
      EventQueue.invokeAndWait(
          () -> {
            try {
              invocation.proceed();
            } catch (Throwable problem) {
              thrown[0] = problem;
            }
          });
    } catch (InvocationTargetException e) {
      throw e.getCause();
    }
    if (thrown[0] != null) {
      throw thrown[0];
    }
  }
}
