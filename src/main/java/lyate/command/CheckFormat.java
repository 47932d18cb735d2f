package lyate.command;

import java.util.Locale;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** How one review is written: the plain formats, or a document. */
enum CheckFormat {
    TEXT, CSV, JSON, HTML;

    /** Reads the option's value. */
    static final class Converter implements ITypeConverter<CheckFormat> {
        @Override
        public CheckFormat convert(String text) {
            for (CheckFormat format : values()) {
                if (format.name().equalsIgnoreCase(text)) {
                    return format;
                }
            }
            throw new TypeConversionException("found '" + text.toLowerCase(Locale.ROOT) + "', expected text, csv, json or html");
        }
    }
}
