package lyate.stock;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A solvent: a row of {@code solvents.csv}.
 *
 * @param id                stable name; the id of its {@link Medium} where it has a scale of its own
 * @param name              usual name
 * @param aliases           other names and abbreviations
 * @param smiles            structure
 * @param kind              protic, dipolar aprotic or of low polarity
 * @param scale             medium whose pKa differences stand for it: its own where measured, else the proxy
 * @param donorPKas         pKa of its most acidic proton by medium, on the molar scale
 * @param boilingPoint      degrees C at 101.325 kPa
 * @param meltingPoint      degrees C
 * @param density           g/mL at 20 degrees C
 * @param permittivity      relative, at 25 degrees C
 * @param heatCapacity      J/(g K)
 * @param molarMass         g/mol
 * @param typicalWaterPpm   water of a bottle handled with care, mass ppm
 * @param saturationPpm     water at saturation, mass ppm; absent where miscible
 * @param notes             remarks for the user
 * @param source            citation
 */
public record Solvent(String id, String name, List<String> aliases, String smiles, Kind kind, Medium scale,
                      Map<Medium, KnownPKa> donorPKas, double boilingPoint, OptionalDouble meltingPoint,
                      double density, OptionalDouble permittivity, OptionalDouble heatCapacity, double molarMass,
                      OptionalDouble typicalWaterPpm, OptionalDouble saturationPpm, String notes, String source)
        implements Named {

    /** How a solvent treats ions and protons. */
    public enum Kind { PROTIC, DIPOLAR_APROTIC, LOW_POLARITY }

    public Solvent {
        aliases = List.copyOf(aliases);
        donorPKas = Map.copyOf(donorPKas);
    }

    /** The solvent's own concentration, mol/L. */
    public double molarity() {
        return 1000 * density / molarMass;
    }

    /** pKa of its most acidic proton in a medium, where known. */
    public Optional<KnownPKa> donorPKa(Medium medium) {
        return Optional.ofNullable(donorPKas.get(medium));
    }
}
