package lyate.command;

import java.util.List;
import java.util.Locale;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** How results are written. */
enum Format {
    TEXT, CSV, JSON, HTML;

    /** Reads the value of an option that offers the plain formats. */
    static final class Converter implements ITypeConverter<Format> {
        @Override
        public Format convert(String text) {
            return oneOf(List.of(TEXT, CSV, JSON), text, "text, csv or json");
        }
    }

    /** Reads the value of an option that offers a document as well. */
    static final class OrHtml implements ITypeConverter<Format> {
        @Override
        public Format convert(String text) {
            return oneOf(List.of(values()), text, "text, csv, json or html");
        }
    }

    private static Format oneOf(List<Format> offered, String text, String expected) {
        return offered.stream().filter(format -> format.name().equalsIgnoreCase(text)).findFirst().orElseThrow(
                () -> new TypeConversionException("found '" + text.toLowerCase(Locale.ROOT) + "', expected " + expected));
    }
}
