package manyskies.farm;

import java.lang.reflect.InvocationHandler;
import java.lang.reflect.Proxy;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Ctrl-C while the farm works: the first throws the switch, the second ends the program at once. A
 * request to terminate (a queue's time limit, a shutdown) and the end of a session are heard alike.
 *
 * <p>A shutdown hook would hear the first only, and the JVM would be going down already. The class
 * that hears signals, sun.misc.Signal, is supported but in no standard module: javac warns of its
 * name and allows no suppression, so it is reached by reflection.
 */
public final class Interrupts {
    private static final int ENDED_BY_CTRL_C = 130;

    private static final String[] SIGNALS = {"INT", "TERM", "HUP"};

    private final Map<String, Object> before = new LinkedHashMap<>(); // signal to its handler

    private Interrupts() {}

    /** Listens until {@link #close}. */
    public static Interrupts throwing(StopSwitch stop) {
        InvocationHandler onSignal =
                (proxy, method, arguments) -> {
                    if (method.getName().equals("handle")) {
                        interrupted(stop);
                        return null;
                    }
                    return method.invoke(stop, arguments); // equals, hashCode, toString
                };
        Object handler =
                Proxy.newProxyInstance(
                        Interrupts.class.getClassLoader(),
                        new Class<?>[] {type("sun.misc.SignalHandler")},
                        onSignal);
        Interrupts interrupts = new Interrupts();
        for (String signal : SIGNALS) {
            interrupts.before.put(signal, handle(signal, handler));
        }
        return interrupts;
    }

    private static void interrupted(StopSwitch stop) {
        if (stop.stopped()) {
            Runtime.getRuntime().halt(ENDED_BY_CTRL_C);
        }
        stop.stop();
    }

    /** Signal.handle(new Signal(name), handler). */
    private static Object handle(String name, Object handler) {
        Class<?> signal = type("sun.misc.Signal");
        try {
            return signal.getMethod("handle", signal, type("sun.misc.SignalHandler"))
                    .invoke(null, signal.getConstructor(String.class).newInstance(name), handler);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException("this JVM does not let a program hear Ctrl-C", e);
        }
    }

    private static Class<?> type(String name) {
        try {
            return Class.forName(name);
        } catch (ClassNotFoundException e) {
            throw new IllegalStateException("this JVM has no " + name, e);
        }
    }

    /** Gives the signals back to whom they belonged. */
    public void close() {
        before.forEach(Interrupts::handle);
    }
}
