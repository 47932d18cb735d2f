package lyate.table;

import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads one table file; collects problems instead of stopping at the first. */
final class TableParser {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder()
            .setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true).get();

    private final Schema schema;
    private final TableText source;
    private final List<TableProblem> problems;
    private final Map<String, Integer> lineOfId = new HashMap<>();
    /** Index of each schema column among the cells of a row. */
    private final Map<String, Integer> places;
    /** Index of each schema column among the cells of the file, -1 where the file leaves it out. */
    private final int[] placesInFile;

    TableParser(Schema schema, TableText source, List<TableProblem> problems) {
        this.schema = schema;
        this.source = source;
        this.problems = problems;
        List<String> names = columnNames();
        this.places = names.stream().collect(Collectors.toUnmodifiableMap(name -> name, names::indexOf));
        this.placesInFile = new int[names.size()];
    }

    /** The rows that passed; the others are in the problems. */
    List<Row> parse() {
        checkVersion();
        List<Row> rows = new ArrayList<>();
        List<String> header = null;
        int linesRead = 0;
        try (CSVParser parser = CSVParser.builder().setReader(new StringReader(text())).setFormat(FORMAT).get()) {
            for (CSVRecord csv : parser) {
                int line = firstLine(linesRead);
                linesRead = (int) parser.getCurrentLineNumber();
                if (csv.size() == 1 && csv.get(0).isBlank()) {
                    continue;
                }
                if (header != null) {
                    read(csv, header.size(), line, rows);
                } else if (checkHeader(csv.toList(), line)) {
                    header = csv.toList();
                    Arrays.setAll(placesInFile, column -> csv.toList().indexOf(schema.columns().get(column).name()));
                } else {
                    return rows;
                }
            }
        } catch (UncheckedIOException | IOException e) {
            // Reading from memory fails for one reason only: the quotes are not in order.
            int line = firstLine(linesRead);
            problem(line, "", firstLetters(line), "well-formed CSV: every quoted cell closed, and nothing after its closing quote");
            return rows;
        }
        if (header == null) {
            problem(0, "", "no header line", "a header line with " + String.join(",", columnNames()));
        }
        return rows;
    }

    private String text() {
        return String.join("\n", source.lines());
    }

    private void checkVersion() {
        String wanted = "# version: " + schema.version();
        List<String> head = source.lines().stream().takeWhile(line -> line.startsWith("#") || line.isBlank()).toList();
        if (head.stream().noneMatch(line -> line.strip().equals(wanted))) {
            String found = head.stream().filter(line -> line.contains("version:")).findFirst().orElse("");
            problem(Math.max(1, 1 + head.indexOf(found)), "", found, "a line '" + wanted + "' among the leading # lines");
        }
    }

    private boolean checkHeader(List<String> header, int line) {
        int before = problems.size();
        for (String name : header) {
            if (!columnNames().contains(name)) {
                problem(line, name, name, "one of " + String.join(", ", NearestNames.of(name, columnNames(), 3)));
            } else if (header.indexOf(name) != header.lastIndexOf(name)) {
                problem(line, name, name, "every column once");
            }
        }
        schema.columns().stream().filter(Column::required).map(Column::name).filter(name -> !header.contains(name))
                .forEach(name -> problem(line, name, "no such column", "a column " + name));
        return problems.size() == before;
    }

    private void read(CSVRecord csv, int width, int line, List<Row> rows) {
        if (csv.size() != width) {
            problem(line, "", csv.size() + " cells", width + " cells, as in the header");
            return;
        }
        List<String> cells = new ArrayList<>(placesInFile.length);
        boolean sound = true;
        for (int column = 0; column < placesInFile.length; column++) {
            String cell = placesInFile[column] < 0 ? "" : csv.get(placesInFile[column]);
            cells.add(cell);
            sound &= check(schema.columns().get(column), cell, line);
        }
        String id = cells.get(places.get("id"));
        Integer first = id.isEmpty() ? null : lineOfId.putIfAbsent(id, line);
        if (first != null) {
            problem(line, "id", id, "an id of its own; line " + first + " has the same");
        } else if (sound) {
            rows.add(new Row(source, line, places, cells));
        }
    }

    private boolean check(Column column, String cell, int line) {
        String expected = CellCheck.expected(column, cell);
        if (!expected.isEmpty()) {
            problem(line, column.name(), cell, expected);
        }
        return expected.isEmpty();
    }

    /** Number of the line on which the record begins that follows the lines already read: comments and blanks lie between. */
    private int firstLine(int linesRead) {
        List<String> lines = source.lines();
        int index = linesRead;
        while (index < lines.size() && (lines.get(index).isEmpty() || lines.get(index).startsWith("#"))) {
            index++;
        }
        return Math.min(index + 1, lines.size());
    }

    private String firstLetters(int line) {
        String text = line >= 1 ? source.lines().get(line - 1) : "";
        return text.substring(0, Math.min(text.length(), 40));
    }

    private List<String> columnNames() {
        return schema.columns().stream().map(Column::name).toList();
    }

    private void problem(int line, String column, String found, String expected) {
        problems.add(source.problem(line, column, found, expected));
    }
}
