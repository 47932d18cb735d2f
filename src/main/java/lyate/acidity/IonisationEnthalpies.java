package lyate.acidity;

import static lyate.table.Column.list;
import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import lyate.site.SiteClass;
import lyate.stock.BaseFamily;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * Ionisation enthalpies in water by kind of acid and base: the rows of {@code ionisation-enthalpies.csv}. They count on
 * the aqueous scale only. Loaded once; immutable; safe to share between threads.
 */
public final class IonisationEnthalpies {

    static final Schema SCHEMA = Schema.of("ionisation-enthalpies.csv", text("id"), word("of", "site", "base"),
            list("families"), number("enthalpy"), number("sigma"), text("source"));

    private final Map<String, IonisationEnthalpy> byFamily;

    private IonisationEnthalpies(Map<String, IonisationEnthalpy> byFamily) {
        this.byFamily = Map.copyOf(byFamily);
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    public static IonisationEnthalpies load(TableFolders folders) {
        Map<String, IonisationEnthalpy> byFamily = new HashMap<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            IonisationEnthalpy enthalpy = new IonisationEnthalpy(row.number("enthalpy").orElseThrow(),
                    row.number("sigma").orElseThrow(), row.text("source"));
            row.list("families").forEach(family -> byFamily.put(key(row.text("of"), family), enthalpy));
        }
        return new IonisationEnthalpies(byFamily);
    }

    /** Of a site of that class, whether its proton leaves or arrives. */
    public Optional<IonisationEnthalpy> of(SiteClass siteClass) {
        return Optional.ofNullable(byFamily.get(key("site", siteClass.family())));
    }

    /** Of the conjugate acid of a base of that family. */
    public Optional<IonisationEnthalpy> of(BaseFamily family) {
        return Optional.ofNullable(byFamily.get(key("base", family.id())));
    }

    private static String key(String of, String family) {
        return of + " " + family;
    }
}
