package lyate.table;

import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads one table file; collects problems instead of stopping at the first. */
final class TableParser {

    private static final CSVFormat FORMAT = CSVFormat.RFC4180.builder()
            .setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true).get();

    private final Schema schema;
    private final String file;
    private final List<TableProblem> problems;

    TableParser(Schema schema, String file, List<TableProblem> problems) {
        this.schema = schema;
        this.file = file;
        this.problems = problems;
    }

    /** The rows that passed; the others are in the problems. */
    List<Row> parse(String text) {
        checkVersion(text);
        List<String> lines = text.lines().toList();
        List<Row> rows = new ArrayList<>();
        Map<String, Integer> lineOfId = new HashMap<>();
        try (CSVParser parser = CSVParser.builder().setReader(new StringReader(text)).setFormat(FORMAT).get()) {
            List<String> header = null;
            long lineBefore = 0;
            for (CSVRecord csv : parser) {
                int line = firstLine(lines, lineBefore);
                lineBefore = parser.getCurrentLineNumber();
                if (header == null) {
                    header = csv.toList();
                    if (!checkHeader(header, line)) {
                        return rows;
                    }
                } else {
                    read(csv, header, line, lineOfId, rows);
                }
            }
            if (header == null) {
                problem(0, "", "no header line", "a header line with " + columnNames());
            }
        } catch (CSVException e) {
            problem(0, "", e.getMessage(), "well-formed CSV (RFC 4180)");
        } catch (IOException e) {
            throw new IllegalStateException("reading from memory failed", e);
        }
        return rows;
    }

    private void checkVersion(String text) {
        String wanted = "# version: " + schema.version();
        boolean stated = text.lines().takeWhile(line -> line.startsWith("#")).anyMatch(line -> line.strip().equals(wanted));
        if (!stated) {
            problem(1, "", text.lines().findFirst().orElse(""), "a line '" + wanted + "' among the leading # lines");
        }
    }

    private boolean checkHeader(List<String> header, int line) {
        List<String> missing = columnNames().stream().filter(name -> !header.contains(name)).toList();
        List<String> unknown = header.stream().filter(name -> !columnNames().contains(name)).toList();
        missing.forEach(name -> problem(line, name, "no such column", "a column " + name));
        unknown.forEach(name -> problem(line, name, name,
                "one of " + String.join(", ", NearestNames.of(name, columnNames(), 3))));
        return missing.isEmpty() && unknown.isEmpty();
    }

    private void read(CSVRecord csv, List<String> header, int line, Map<String, Integer> lineOfId, List<Row> rows) {
        if (csv.size() != header.size()) {
            problem(line, "", csv.size() + " cells", header.size() + " cells, as in the header");
            return;
        }
        Map<String, String> cells = new LinkedHashMap<>();
        boolean sound = true;
        for (Column column : schema.columns()) {
            String cell = csv.get(header.indexOf(column.name()));
            cells.put(column.name(), cell);
            sound &= check(column, cell, line);
        }
        Integer first = lineOfId.putIfAbsent(cells.get("id"), line);
        if (first != null) {
            problem(line, "id", cells.get("id"), "an id of its own (line " + first + " has the same)");
        } else if (sound) {
            rows.add(new Row(file, line, cells));
        }
    }

    private boolean check(Column column, String cell, int line) {
        String expected = CellCheck.expected(column, cell);
        if (!expected.isEmpty()) {
            problem(line, column.name(), cell, expected);
        }
        return expected.isEmpty();
    }

    /** Line on which the record begins that follows {@code lineBefore}: comments and blank lines lie between. */
    private static int firstLine(List<String> lines, long lineBefore) {
        int index = (int) lineBefore;
        while (index < lines.size() && (lines.get(index).isBlank() || lines.get(index).startsWith("#"))) {
            index++;
        }
        return index + 1;
    }

    private List<String> columnNames() {
        return schema.columns().stream().map(Column::name).toList();
    }

    private void problem(int line, String column, String found, String expected) {
        problems.add(new TableProblem(file, line, column, found, expected));
    }
}
