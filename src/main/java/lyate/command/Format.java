package lyate.command;

import java.util.Locale;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** How results are written. */
enum Format {
    TEXT, CSV, JSON;

    /** Reads the option's value. */
    static final class Converter implements ITypeConverter<Format> {
        @Override
        public Format convert(String text) {
            for (Format format : values()) {
                if (format.name().equalsIgnoreCase(text)) {
                    return format;
                }
            }
            throw new TypeConversionException("found '" + text.toLowerCase(Locale.ROOT) + "', expected text, csv or json");
        }
    }
}
