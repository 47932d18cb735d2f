package lyate.command;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** Writes what every command prints for one set of questions into a folder, an output a file. */
final class AllOutputs {

    private static final String SHEET = "step,substrate,base,solvent,base_equiv,temperature_C,amount_g,notes\n"
            + "=1+1,CC(=O)CC(=O)OCC,LITHIUM DIISOPROPYLAMIDE,THF,\"2,05\",-78,\"1,5\",@SUM(A1)\n+I,OC(=O)CC#N,TRIETHYLAMINE,DICHLOROMETHANE,,,,\"-1+1\"\n-2,C(,NaH,DMF,x,,,=A1\n";

    private AllOutputs() {}

    /** Argument: an empty folder. */
    public static void main(String[] arguments) throws IOException {
        Path folder = Path.of(arguments[0]);
        Path sheet = Files.writeString(folder.resolve("sheet.csv"), SHEET);
        List<List<String>> commands = List.of(
                List.of("check", "--substrate", "OC(=O)CC#N", "--base", "LIHMDS", "--solvent", "thf", "--equiv", "1,1", "--temperature", "-78"),
                List.of("check", "--substrate", "INDOLE", "--base", "NAH", "--solvent", "DMF", "--format", "html"),
                List.of("check", "--substrate", "CC(C)=O", "--base", "LDA", "--solvent", "THF", "--format", "json"),
                List.of("check", "--substrate", "CC(C)=O", "--base", "LDA", "--solvent", "THF", "--format", "csv"),
                List.of("sites", "--format", "csv", "--solvent", "DIMETHYL SULFOXIDE", "@x", "CC(=O)CC(=O)OCC"),
                List.of("sites", "CC(=O)CC(=O)OCC"), List.of("sites", "--format", "json", "CCO"),
                List.of("bases", "--substrate", "Oc1ccccc1", "--solvent", "DMF", "--format", "csv"),
                List.of("bases", "--substrate", "Oc1ccccc1", "--solvent", "DMF"),
                List.of("review", sheet.toString()), List.of("review", sheet.toString(), "-o", folder.resolve("result.json").toString()),
                List.of("review", sheet.toString(), "--report", folder.resolve("route.html").toString()),
                List.of("compare", sheet.toString(), sheet.toString(), "--format", "csv"), List.of("tables"), List.of("review", "--help"),
                List.of("check", "--base", "LIHMDI", "--solvent", "ISOPROPIL", "--substrate", "I"));
        for (int i = 0; i < commands.size(); i++) {
            try (OutputStream out = Files.newOutputStream(folder.resolve("out-" + i + ".txt")); OutputStream err = Files.newOutputStream(folder.resolve("err-" + i + ".txt"))) {
                Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), commands.get(i).toArray(String[]::new));
            }
        }
    }
}
