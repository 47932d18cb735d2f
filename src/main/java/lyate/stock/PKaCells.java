package lyate.stock;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.table.Column;
import lyate.table.Row;
import lyate.table.TableProblem;

/** The cells {@code pka_X, sigma_X, source_X} that several tables have, and lists of further stages. */
final class PKaCells {

    /** Uncertainty of a tabulated aqueous stage, for which the tables give no figure of their own. */
    private static final double STAGE_SIGMA = 0.1;

    private PKaCells() {}

    /** The columns of one medium. */
    static List<Column> columns(String medium) {
        return List.of(Column.number("pka_" + medium).optional(), Column.number("sigma_" + medium).optional(),
                Column.text("source_" + medium).optional());
    }

    static Map<Medium, KnownPKa> read(Row row, List<Medium> media, List<TableProblem> problems) {
        Map<Medium, KnownPKa> values = new HashMap<>();
        for (Medium medium : media) {
            read(row, medium.id(), problems).ifPresent(value -> values.put(medium, value));
        }
        return values;
    }

    static Optional<KnownPKa> read(Row row, String suffix, List<TableProblem> problems) {
        if (!row.has("pka_" + suffix)) {
            return Optional.empty();
        }
        if (!row.has("sigma_" + suffix) || !row.has("source_" + suffix)) {
            problems.add(row.problem("pka_" + suffix, "a sigma and a source beside the value"));
            return Optional.empty();
        }
        return Optional.of(new KnownPKa(row.number("pka_" + suffix).getAsDouble(),
                row.number("sigma_" + suffix).getAsDouble(), row.text("source_" + suffix)));
    }

    static List<KnownPKa> furtherStages(Row row, List<TableProblem> problems) {
        List<KnownPKa> stages = new ArrayList<>();
        for (String text : row.list("further_stages")) {
            try {
                stages.add(new KnownPKa(Double.parseDouble(text), STAGE_SIGMA, row.text("source_water")));
            } catch (NumberFormatException e) {
                problems.add(row.problem("further_stages", "numbers separated by ;"));
            }
        }
        return stages;
    }

    static Optional<Base.Strength> strength(Row row, List<TableProblem> problems) {
        if (!row.has("strength")) {
            return Optional.empty();
        }
        double value = row.number("strength").getAsDouble();
        return switch (row.text("strength_unit")) {
            case "mol/L" -> Optional.of(new Base.Strength(value, Base.Strength.Unit.MOL_PER_LITRE));
            case "mass-percent" -> Optional.of(new Base.Strength(value, Base.Strength.Unit.MASS_PERCENT));
            default -> {
                problems.add(row.problem("strength_unit", "mol/L or mass-percent beside the strength"));
                yield Optional.empty();
            }
        };
    }
}
