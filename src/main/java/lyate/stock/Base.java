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
 * @param strength           strength of that stock as a number, where it is not the pure substance
 * @param molarMass          g/mol of the formula given
 * @param density            g/mL of the liquid or the stock solution at 20 to 25 degrees C
 * @param gas                gas given off as its last stage, for most the only one, is protonated: {@code hydrogen} from a
 *                           hydride, {@code carbon dioxide} from a carbonate; empty for none
 * @param highestTemperatures degrees C up to which it is usually kept, by solvent id
 * @param notes              remarks for the user
 * @param source             citation for form, stock and density; each pKa has its own
 */
public record Base(String id, String name, List<String> aliases, BaseFamily family, String smiles, String conjugateAcid,
                   String counterIon, Map<Medium, KnownPKa> pKas, List<KnownPKa> furtherStages, int protonsPerFormula,
                   String nucleophilicity, String form, String stock, Optional<Strength> strength, double molarMass,
                   OptionalDouble density, String gas, Map<String, Double> highestTemperatures, String notes,
                   String source) implements Named {

    /**
     * How much base a stock holds.
     *
     * @param value number in the unit
     * @param unit  mol per litre, or percent by mass
     */
    public record Strength(double value, Unit unit) {

        /** Units a strength is given in. */
        public enum Unit { MOL_PER_LITRE, MASS_PERCENT }
    }

    public Base {
        aliases = List.copyOf(aliases);
        pKas = Map.copyOf(pKas);
        furtherStages = List.copyOf(furtherStages);
        highestTemperatures = Map.copyOf(highestTemperatures);
    }

    /** pKa of the conjugate acid in a medium, where known. */
    public Optional<KnownPKa> pKa(Medium medium) {
        return Optional.ofNullable(pKas.get(medium));
    }
}
