package lyate.sheet;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;

/** The example that comes with the program: an invented route with some deliberate mistakes. */
public final class DemoRoute {

    private static final String RESOURCE = "/lyate/demo-route.csv";

    private DemoRoute() {}

    /** The file as text; docs/example-route.csv is the same. */
    public static String text() {
        try (InputStream stream = DemoRoute.class.getResourceAsStream(RESOURCE)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException(RESOURCE + " is packaged with the program", e);
        }
    }

    /** The example as a sheet. */
    public static RouteSheet sheet() {
        try {
            return RouteSheet.parse(text());
        } catch (SheetException e) {
            throw new IllegalStateException(RESOURCE + " is a sound sheet", e);
        }
    }
}
