package lyate.molecule;

import org.openscience.cdk.tools.ILoggingTool;
import org.openscience.cdk.tools.LoggingToolFactory;

/**
 * The toolkit reports what it stumbles over on standard error, beside the exception it throws. Everything found is said
 * once and in words by this package, so its own reports go nowhere.
 */
public final class SilentLog implements ILoggingTool {

    /** Takes the place of the toolkit's log; to be called before one of its readers is used. */
    static void install() {
        LoggingToolFactory.setLoggingToolClass(SilentLog.class);
    }

    /** Called by the toolkit, which asks for a log per class. */
    public static ILoggingTool create(Class<?> source) {
        return new SilentLog();
    }

    @Override
    public void dumpSystemProperties() {}

    @Override
    public void setStackLength(int length) {}

    @Override
    public void dumpClasspath() {}

    @Override
    public void debug(Object report) {}

    @Override
    public void debug(Object report, Object... more) {}

    @Override
    public void error(Object report) {}

    @Override
    public void error(Object report, Object... more) {}

    @Override
    public void fatal(Object report) {}

    @Override
    public void info(Object report) {}

    @Override
    public void info(Object report, Object... more) {}

    @Override
    public void warn(Object report) {}

    @Override
    public void warn(Object report, Object... more) {}

    @Override
    public boolean isDebugEnabled() {
        return false;
    }

    @Override
    public void setLevel(int level) {}

    @Override
    public int getLevel() {
        return OFF;
    }
}
