package lyate.sheet;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * Writes a route sheet of as many different structures as wanted, for measuring: a core, two groups on it, conditions in
 * turn. The first 100,000 rows have a substrate
 * each; some 4,500 rows later they come back, under other conditions.
 */
public final class LongSheet {

    /** %1$s and %2$s are the two groups. */
    private static final List<String> CORES = List.of("O=C(%1$s)CC(=O)O%2$s", "c1(%1$s)ccc(cc1)C(=O)C%2$s", "Oc1ccc(O%1$s)c(%2$s)c1",
            "O=C(%1$s)N%2$s", "O=C(C%1$s)OC%2$s", "c1(%1$s)ccc2[nH]c(%2$s)cc2c1", "O=C1CCC(%1$s)CC1%2$s",
            "O=S(=O)(%1$s)Nc1ccc(%2$s)nc1", "OC(%1$s)C(%2$s)C#C", "c1(%1$s)cc(%2$s)n[nH]1", "N#CC(%1$s)C(=O)O%2$s",
            "OC(=O)c1cc(%1$s)ccc1O%2$s", "CCOP(=O)(C%1$s)C%2$s", "C1(C(=O)O%2$s)CCN(%1$s)CC1", "[O-][N+](=O)C(%1$s)C%2$s",
            "O=C1N(%1$s)C(=O)C(%2$s)N1", "S(%1$s)CC(=O)N%2$s", "c1(%1$s)ccc(CN(C)C)c(%2$s)c1", "CC(%1$s)C(=O)c1ccc(%2$s)s1",
            "O=C(%1$s)c1ccc(O)c(%2$s)c1", "CN(C%1$s)C(=O)C%2$s", "C(%1$s)=CC(=O)C%2$s", "N(%1$s)c1ncnc(%2$s)c1", "OC(CO%1$s)C%2$s");
    private static final List<String> GROUPS = List.of("C", "CC", "CCC", "C(C)C", "CCCC", "CC(C)C", "C(C)(C)C", "CCCCC", "CCCCCC", "CCOC", "CCCOC", "CCCl",
            "CCF", "CCCF", "CC(F)(F)F", "CCC=C", "CCCC=C", "CC=CC", "CCC#C", "CCC#N", "CCC(=O)OC", "CCCC(=O)OCC", "CCN(C)C", "CCCN(C)C", "CCSC",
            "C8CCCC8", "C8CCCCC8", "CC8CCCCC8", "c8ccccc8", "Cc8ccccc8", "CCc8ccccc8", "c8ccc(C)cc8", "c8ccc(OC)cc8", "c8ccc(F)cc8", "c8ccc(Cl)cc8",
            "Cc8ccc(OC)cc8", "Cc8ccc(F)cc8", "c8cccc(C)c8", "c8cccc(OC)c8", "c8ccccc8F", "c8ccncc8", "Cc8ccncc8", "c8cccnc8", "c8ccco8", "c8cccs8",
            "Cc8ccco8", "CCC8OCCO8", "CC8CCOCC8", "CCN8CCOCC8", "CC8CC8", "CCC8CC8", "c8ccc(C(C)C)cc8", "c8ccc(C#N)cc8", "c8ccc(C(F)(F)F)cc8",
            "Cc8ccc(C)cc8", "Cc8cccc(Cl)c8", "CCOc8ccccc8", "CCCOc8ccccc8", "CCSc8ccccc8", "CCCCOC", "CCOCCOC",
            "CCCCCCC", "CCCCCl", "Cc8ccccc8F", "c8ccc(Br)cc8", "CCCc8ccccc8");
    private static final List<String> CONDITIONS = List.of("LDA,1.05,THF,-78", "NaH,1.1,DMF,0", "K2CO3,1.5,DMF,60", "n-BuLi,1.05,THF,-78",
            "NaOEt,1,ethanol,25", "Et3N,1.5,dichloromethane,25", "KOtBu,1.1,THF,0", "DBU,1.2,acetonitrile,25", "LiHMDS,1.05,THF,-78", "NaOH,1,water,25",
            "Cs2CO3,2,DMF,60");

    private LongSheet() {}

    /** Arguments: number of rows, file. */
    public static void main(String[] arguments) throws IOException {
        write(Integer.parseInt(arguments[0]), Path.of(arguments[1]));
    }

    static void write(int rows, Path file) throws IOException {
        try (Writer sheet = Files.newBufferedWriter(file)) {
            sheet.write("step,substrate,base,base_equiv,solvent,temperature_C\n");
            for (int row = 0; row < rows; row++) {
                sheet.write("R" + row + "," + substrate(row) + "," + CONDITIONS.get(row % CONDITIONS.size()) + "\n");
            }
        }
    }

    /** The core changes fastest, so that any stretch of the sheet has all kinds in it. */
    static String substrate(int row) {
        int core = row % CORES.size();
        int one = row / CORES.size() % GROUPS.size();
        int two = row / CORES.size() / GROUPS.size() % GROUPS.size();
        return String.format(CORES.get(core), GROUPS.get(one), GROUPS.get(two).replace('8', '9'));
    }
}
