package lyate.stock;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An acid for quench, salt formation or deprotection: a row of {@code acids.csv}.
 *
 * @param id            stable name
 * @param name          usual name
 * @param aliases       other names and abbreviations
 * @param smiles        structure
 * @param pKas          pKa of its first proton by medium
 * @param furtherStages pKa in water of its further protons, strongest first
 * @param uses          any of {@code quench}, {@code salt}, {@code deprotection}
 * @param form          for example {@code solution}
 * @param stock         how it is usually sold
 * @param strength      strength of that stock as a number, where it is not the pure substance
 * @param molarMass     g/mol of the formula given
 * @param density       g/mL of the liquid or the stock at 20 to 25 degrees C
 * @param notes         remarks for the user
 * @param source        citation for stock and density; each pKa has its own
 */
public record Acid(String id, String name, List<String> aliases, String smiles, Map<Medium, KnownPKa> pKas,
                   List<KnownPKa> furtherStages, List<String> uses, String form, String stock,
                   Optional<Base.Strength> strength, double molarMass, OptionalDouble density, String notes,
                   String source) implements Named {

    public Acid {
        aliases = List.copyOf(aliases);
        pKas = Map.copyOf(pKas);
        furtherStages = List.copyOf(furtherStages);
        uses = List.copyOf(uses);
    }

    /** pKa of the first proton in a medium, where known. */
    public Optional<KnownPKa> pKa(Medium medium) {
        return Optional.ofNullable(pKas.get(medium));
    }
}
