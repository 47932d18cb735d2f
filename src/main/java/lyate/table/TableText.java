package lyate.table;

import java.util.List;
import java.util.Locale;

/**
 * The text of a table file, kept so that a problem can show its neighbourhood.
 *
 * @param file  name for messages
 * @param lines the file line by line
 */
public record TableText(String file, List<String> lines) {

    private static final int WIDTH = 100;

    public TableText {
        lines = List.copyOf(lines);
    }

    /** The lines of a text. */
    static TableText of(String file, String text) {
        return new TableText(file, text.lines().toList());
    }

    /** A problem with what stands in a line, with the lines around it. */
    TableProblem problem(int line, String column, String found, String expected) {
        return new TableProblem(file, line, column, found, expected, excerpt(line, found));
    }

    private String excerpt(int line, String found) {
        StringBuilder excerpt = new StringBuilder();
        int place = line >= 1 && line <= lines.size() && !found.isEmpty() ? lines.get(line - 1).indexOf(found) : -1;
        int from = Math.max(0, Math.min(place, place + found.length() - WIDTH + 10));
        for (int number = Math.max(1, line - 1); number <= Math.min(lines.size(), line + 1) && line > 0; number++) {
            String mark = number == line ? ">" : " ";
            excerpt.append(String.format(Locale.ROOT, "%s%6d | %s\n", mark, number, cut(lines.get(number - 1), from)));
            if (number == line && place >= 0) {
                excerpt.append(" ".repeat(7)).append(" | ").append(" ".repeat(place - from)).append("^\n");
            }
        }
        return excerpt.toString().stripTrailing();
    }

    private static String cut(String line, int from) {
        return line.substring(Math.min(from, line.length()), Math.min(line.length(), from + WIDTH));
    }
}
