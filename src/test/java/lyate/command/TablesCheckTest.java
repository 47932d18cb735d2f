package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A folder of the user's own with several mistakes at once: each is named, once. */
class TablesCheckTest {

    private static final String BASES = "# version: 1\nid,name,aliases,family,smiles,conjugate_acid,counter_ion,pka_water,sigma_water,source_water,"
            + "protons_per_formula,nucleophilicity,form,stock,molar_mass,source\n";

    @TempDir
    private Path folder;

    @Test
    void everyFaultOfARowIsNamed() throws IOException {
        write("bases.csv", BASES + "mine,my base,,alkoxid,[Na+].COCC[O-,COCCO,Na,14.8,,,1,high,solid,solid,98.08,own\n");
        assertNamed("column family: found 'alkoxid'", "column smiles: found '[Na+].COCC[O-'", "column pka_water: found '14.8'");
    }

    @Test
    void faultsOfSeveralTablesAreNamedAtOnce() throws IOException {
        write("bases.csv", BASES + "mine,my base,,alkoxide,[Na+].CC[O-],CCO,Na,\"15,9\",0.1,own,4,high,solid,solid,68.05,own\n");
        write("solvents.csv", "# version: 1\nid,name,smiles,kind,scale,boiling_point,density,molar_mass,source\n"
                + "s,my solvent,CCOCC,low polarity,dmso,35,0.71,74.12,own\n");
        write("measured-acidities.csv", "# version: 1\nid,name,smiles,site,role,medium,pka,sigma,temperature_C,source\n"
                + "m,phenol,Oc1ccccc1,O1,acd,water,9.99,0.05,25,own\n");
        write("side-reactions.csv", "# version: 1\nid,agent,target,smarts,bases,protons_first,kind,severity,wins,sentence,source,hit,miss\n"
                + "r,base,substrate,[CX3]=O,lda,none,nucleophilic-additon,note,no,Says something.,own,CC=O|LDA|THF|25,CC|LDA|THF|25\n");
        assertNamed("column pka_water: found '15,9'", "column protons_per_formula: found '4'", "column kind: found 'low polarity'",
                "column role: found 'acd'", "column kind: found 'nucleophilic-additon'");
    }

    private void write(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private void assertNamed(String... parts) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), "tables", "--check", folder.toString());
        String told = err.toString(StandardCharsets.UTF_8);
        assertEquals(1, code);
        for (String part : List.of(parts)) {
            assertEquals(2, told.split(java.util.regex.Pattern.quote(part), -1).length, "once: " + part + "\n" + told);
        }
        assertTrue(out.toString(StandardCharsets.UTF_8).isEmpty());
    }
}
