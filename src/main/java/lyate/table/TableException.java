package lyate.table;

import java.util.List;
import java.util.stream.Collectors;

/** A table could not be read; holds every problem found in it, not just the first. */
public final class TableException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<TableProblem> problems;

    public TableException(List<TableProblem> problems) {
        super(problems.stream().map(TableProblem::toString).collect(Collectors.joining("\n")));
        this.problems = List.copyOf(problems);
    }

    /** The problems, in the order of the file. */
    public List<TableProblem> problems() {
        return problems;
    }
}
