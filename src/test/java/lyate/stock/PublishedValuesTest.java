package lyate.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;

import lyate.table.TableFolders;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Spot checks of the shelf tables against handbooks. */
class PublishedValuesTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());

    /** Normal boiling points, CRC Handbook of Chemistry and Physics, 90th ed., section 15 (laboratory solvents). */
    @ParameterizedTest
    @CsvSource({"thf, 65", "et2o, 34.5", "dmso, 189", "dmf, 153", "mecn, 81.65", "dcm, 40", "chloroform, 61.17",
        "meoh, 64.6", "etoh, 78.29", "iproh, 82.3", "tbuoh, 82.4", "toluene, 110.63", "benzene, 80.09",
        "hexane, 68.73", "acetone, 56.05", "etoac, 77.11", "dioxane, 101.5", "pyridine, 115.23", "nitromethane, 101.19",
        "acoh, 117.9", "dme, 84.5", "mtbe, 55.0", "nh3-liq, -33.33"})
    void boilsWhereTheHandbookSays(String solvent, double celsius) throws UnknownNameException {
        assertEquals(celsius, STOCKROOM.solvent(solvent).boilingPoint(), 1.1);
    }

    /** Relative permittivities, CRC Handbook of Chemistry and Physics, 90th ed., section 6 (at 20 to 25 degrees C). */
    @ParameterizedTest
    @CsvSource({"thf, 7.52", "dmso, 47.2", "dmf, 38.2", "mecn, 36.6", "dcm, 8.93", "meoh, 33.0", "etoh, 25.3",
        "toluene, 2.38", "acetone, 21.0", "water, 80.1"})
    void permittivityAgreesWithTheHandbook(String solvent, double permittivity) throws UnknownNameException {
        assertEquals(permittivity, STOCKROOM.solvent(solvent).permittivity().orElseThrow(), 0.05 * permittivity);
    }

    /** pKa of conjugate acids in water at 25 degrees C, CRC Handbook, 90th ed., section 8. */
    @ParameterizedTest
    @CsvSource({"ammonia, 9.25", "triethylamine, 10.75", "pyridine, 5.23", "imidazole, 6.99", "aniline, 4.60",
        "piperidine, 11.12", "morpholine, 8.50", "sodium acetate, 4.76", "sodium bicarbonate, 6.35",
        "potassium carbonate, 10.33", "ethylenediamine, 9.92", "benzylamine, 9.34", "potassium fluoride, 3.20",
        "sodium phenoxide, 9.99", "methylamine, 10.66", "quinoline, 4.90"})
    void aqueousStrengthAgreesWithTheHandbook(String base, double pKa) throws UnknownNameException {
        assertEquals(pKa, STOCKROOM.base(base).pKa(Medium.WATER).orElseThrow().pKa(), 0.1);
    }

    /** Bordwell, Acc. Chem. Res. 1988, 21, 456; alcohols: Olmstead, Margolin & Bordwell, J. Org. Chem. 1980, 45, 3295. */
    @ParameterizedTest
    @CsvSource({"dmso, 35.1", "mecn, 31.3", "acetone, 26.5", "nitromethane, 17.2", "meoh, 29.0", "etoh, 29.8",
        "tbuoh, 32.2", "acoh, 12.3"})
    void solventAcidityInDmsoAgreesWithBordwell(String solvent, double pKa) throws UnknownNameException {
        assertEquals(pKa, STOCKROOM.solvent(solvent).donorPKa(Medium.DMSO).orElseThrow().pKa(), 0.2);
    }

    /** Kaljurand et al., J. Org. Chem. 2005, 70, 1019 (acetonitrile). */
    @ParameterizedTest
    @CsvSource({"DBU, 24.34", "TBD, 26.03", "MTBD, 25.49", "BEMP, 27.63", "triethylamine, 18.82", "pyridine, 12.53",
        "DMAP, 17.95"})
    void strengthInAcetonitrileAgreesWithTheTartuScale(String base, double pKa) throws UnknownNameException {
        assertEquals(pKa, STOCKROOM.base(base).pKa(Medium.ACETONITRILE).orElseThrow().pKa(), 0.01);
    }

    @ParameterizedTest
    @CsvSource({"water, 55.3", "methanol, 24.7", "THF, 12.3", "DMSO, 14.1"})
    void molarityFollowsFromDensityAndMolarMass(String solvent, double molPerLitre) throws UnknownNameException {
        assertEquals(molPerLitre, STOCKROOM.solvent(solvent).molarity(), 0.15);
    }
}
