package lyate.stock;

import java.util.List;
import java.util.OptionalDouble;

/**
 * An electrophile or other partner of the anion: a row of {@code partners.csv}.
 *
 * @param id             stable name
 * @param name           usual name
 * @param aliases        other names and abbreviations
 * @param kind           for example {@code alkyl-halide}
 * @param smiles         structure
 * @param toleratedBases ids of base families that may be in the flask with it
 * @param consumingBases ids of base families that react with it themselves; a family in neither list is not known
 * @param molarMass      g/mol
 * @param density        g/mL at 20 to 25 degrees C, for liquids
 * @param boilingPoint   degrees C at 101.325 kPa, where known
 * @param notes          what to mind, hazards included
 * @param source         citation
 */
public record Partner(String id, String name, List<String> aliases, String kind, String smiles,
                      List<String> toleratedBases, List<String> consumingBases, double molarMass,
                      OptionalDouble density, OptionalDouble boilingPoint, String notes, String source)
        implements Named {

    public Partner {
        aliases = List.copyOf(aliases);
        toleratedBases = List.copyOf(toleratedBases);
        consumingBases = List.copyOf(consumingBases);
    }
}
