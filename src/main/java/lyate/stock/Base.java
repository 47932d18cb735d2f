package lyate.stock;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A base on the shelf: a row of {@code bases.csv}.
 *
 * @param id                 stable name
 * @param name               usual name
 * @param aliases            other names and abbreviations it is found by
 * @param family             what it has in common with its kind
 * @param smiles             structure, counter-ion included
 * @param conjugateAcid      SMILES of what it becomes on taking one proton
 * @param counterIon         for example {@code Li}; {@code none} for a neutral base
 * @param pKas               pKa of the conjugate acid by medium
 * @param furtherStages      pKa in water of the conjugate acids of its further basic stages, strongest first
 * @param protonsPerFormula  protons one formula unit takes in its first stage (2 for calcium hydride)
 * @param nucleophilicity    {@code none}, {@code low}, {@code medium} or {@code high}
 * @param form               for example {@code solution}
 * @param stock              how it is usually sold or made, for example {@code 2.5 M in hexanes}
 * @param molarMass          g/mol of the formula given
 * @param density            g/mL of the liquid or the stock solution at 20 to 25 degrees C
 * @param gas                what it gives off on protonation; empty for nothing
 * @param notes              remarks for the user
 */
public record Base(String id, String name, List<String> aliases, BaseFamily family, String smiles, String conjugateAcid,
                   String counterIon, Map<Medium, KnownPKa> pKas, List<KnownPKa> furtherStages, int protonsPerFormula,
                   String nucleophilicity, String form, String stock, double molarMass, OptionalDouble density,
                   String gas, String notes) {

    public Base {
        aliases = List.copyOf(aliases);
        pKas = Map.copyOf(pKas);
        furtherStages = List.copyOf(furtherStages);
    }

    /** pKa of the conjugate acid in a medium, where known. */
    public Optional<KnownPKa> pKa(Medium medium) {
        return Optional.ofNullable(pKas.get(medium));
    }
}
