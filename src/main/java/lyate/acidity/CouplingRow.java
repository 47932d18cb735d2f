package lyate.acidity;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.List;
import lyate.table.Row;
import lyate.table.Schema;

/**
 * How strongly two sites feel one another: a row of {@code site-couplings.csv}.
 *
 * @param media          ids of media, {@code other} for those no row names, or {@code any}
 * @param charge         {@code anions}, {@code cations}, {@code opposite}, {@code carbon} or {@code any}
 * @param path           word of a {@link CouplingPath.Kind}
 * @param bonds          bonds on the shortest way
 * @param ways           number of shortest ways
 * @param raise          pKa units
 * @param sigma          spread, pKa units
 * @param perFurtherBond factor for every bond beyond {@code bonds}
 * @param source         citation
 */
record CouplingRow(List<String> media, String charge, String path, int bonds, int ways, double raise, double sigma,
                   double perFurtherBond, String source) {

    static final String OTHER_MEDIA = "other";
    static final String ANY = "any";

    /** What {@code site-couplings.csv} looks like. */
    static final Schema SCHEMA = Schema.of("site-couplings.csv", text("id"), list("media"),
            word("charge", "anions", "cations", "opposite", "carbon", ANY),
            word("path", "saturated", "crowded", "conjugated", "cis", "trans", "hydrogen-bonded", "same-atom"), number("bonds"), number("paths"),
            number("raise"), number("sigma"), number("n"), number("per_further_bond"), text("source"));

    static CouplingRow of(Row row) {
        return new CouplingRow(row.list("media"), row.text("charge"), row.text("path"), (int) value(row, "bonds"),
                (int) value(row, "paths"), value(row, "raise"), value(row, "sigma"), value(row, "per_further_bond"),
                row.text("source"));
    }

    private static double value(Row row, String column) {
        return row.number(column).getAsDouble();
    }

    boolean serves(String charge, CouplingPath.Kind kind) {
        return (this.charge.equals(charge) || this.charge.equals(ANY)) && path.equals(kind.word());
    }

    /** Whether neither bonds nor ways of the row exceed those of the path. */
    boolean reaches(CouplingPath between) {
        return bonds <= between.bonds() && ways <= between.ways();
    }
}
