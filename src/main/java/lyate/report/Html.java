package lyate.report;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;

/**
 * Writes markup that is both HTML and well-formed XML, so that browsers and the PDF renderer read the same text.
 * Everything passed as text or attribute value is escaped.
 */
final class Html {

    private static final int REPLACEMENT = 0xFFFD;

    private final StringBuilder out = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    /** Opens an element; attributes are name, value, name, value ... */
    Html open(String name, String... attributes) {
        tag(name, attributes).append('>');
        open.push(name);
        return this;
    }

    /** Closes the element opened last. */
    Html close() {
        out.append("</").append(open.pop()).append(">\n");
        return this;
    }

    /** An element that holds text alone. */
    Html element(String name, String text, String... attributes) {
        tag(name, attributes).append('>').append(escape(text)).append("</").append(name).append(">\n");
        return this;
    }

    /** A list; nothing where there is nothing in it. */
    Html bullets(List<String> lines) {
        if (!lines.isEmpty()) {
            open("ul");
            lines.forEach(line -> element("li", line));
            close();
        }
        return this;
    }

    /** Pieces of markup in two columns of about the same length, in order. */
    Html halves(String element, List<String> pieces) {
        int all = pieces.stream().mapToInt(String::length).sum();
        int cut = 0;
        for (int length = 0; cut < pieces.size() && (cut == 0 || 2 * length + pieces.get(cut).length() < all); cut++) {
            length += pieces.get(cut).length();
        }
        open("div", "class", "row halves");
        for (List<String> half : List.of(pieces.subList(0, cut), pieces.subList(cut, pieces.size()))) {
            open("div", "class", "cell");
            if (!half.isEmpty()) {
                open(element, "class", "pieces");
                half.forEach(this::markup);
                close();
            }
            close();
        }
        return close();
    }

    Html text(String text) {
        out.append(escape(text));
        return this;
    }

    /** Markup that this package has made itself. */
    Html markup(String made) {
        out.append(made);
        return this;
    }

    @Override
    public String toString() {
        if (!open.isEmpty()) {
            throw new IllegalStateException("not closed: " + open);
        }
        return out.toString();
    }

    private StringBuilder tag(String name, String... attributes) {
        out.append('<').append(name);
        for (int i = 0; i < attributes.length; i += 2) {
            out.append(' ').append(attributes[i]).append("=\"").append(escape(attributes[i + 1])).append('"');
        }
        return out;
    }

    /** Text safe in content and in quoted attributes; characters that no document may hold become U+FFFD. */
    static String escape(String text) {
        StringBuilder safe = new StringBuilder(text.length() + 16);
        text.codePoints().forEach(point -> {
            switch (point) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                case '\'' -> safe.append("&#39;");
                case '\t', '\n', '\r' -> safe.append(' ');
                default -> safe.appendCodePoint(allowed(point) ? point : REPLACEMENT);
            }
        });
        return safe.toString();
    }

    /** No control characters, no halves of pairs, no noncharacters, and nothing that turns the order of letters round. */
    private static boolean allowed(int point) {
        boolean noncharacter = (point & 0xFFFE) == 0xFFFE || point >= 0xFDD0 && point <= 0xFDEF;
        return !noncharacter && switch (Character.getType(point)) {
            case Character.CONTROL, Character.SURROGATE -> false;
            case Character.FORMAT -> !(point >= 0x202A && point <= 0x202E || point >= 0x2066 && point <= 0x2069);
            default -> true;
        };
    }
}
