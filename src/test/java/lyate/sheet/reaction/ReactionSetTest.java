package lyate.sheet.reaction;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;

/** The proton meant in a set of reactions from general chemistry, written down before the inference was. */
class ReactionSetTest {

    private final ReactionReader reader = new ReactionReader(new MoleculeReader(), Stockroom.load(TableFolders.packaged()));

    record Row(String id, String part, String map, String kind, Set<String> sites, String reaction) {}

    @Test
    void scratch() throws Exception {
        int right = 0;
        int sure = 0;
        int n = 0;
        List<String> wrong = new ArrayList<>();
        for (Row row : rows()) {
            if (!row.part().equals(System.getProperty("part", "open"))) {
                continue;
            }
            n++;
            long t = System.nanoTime();
            String got;
            String conf;
            try {
                Reaction r = reader.read(row.reaction());
                conf = r.origin().confidence() + " alt " + r.origin().alternatives() + " " + r.origin().remarks() + " base "
                    + r.base().map(b -> b.id()).orElse("-") + " solvent " + r.solvent().map(b -> b.id()).orElse("-") + " partner " + r.partner().map(m -> m.input()).orElse("-");
                boolean ok = r.origin().site().isPresent() && accepted(r, row);
                got = r.reactant() + ":" + r.origin().site().orElse("none") + (r.origin().arrives() ? "+" : "");
                right += ok ? 1 : 0;
                sure += ok && r.origin().sure() ? 1 : 0;
                System.out.println((ok ? "ok    " : "WRONG ") + row.id() + " " + row.sites() + " got " + got + " " + conf + " " + (System.nanoTime() - t) / 1000000 + " ms " + row.reaction());
            } catch (MoleculeException e) {
                System.out.println("WRONG " + row.id() + " " + e.getMessage());
            }
        }
        System.out.println(right + " right, sure " + sure + " of " + n);
    }

    private static boolean accepted(Reaction r, Row row) {
        Molecule m = r.substrate();
        int atom = m.atomLabelled(r.origin().site().get()).getAsInt();
        return row.sites().stream().filter(s -> s.startsWith(r.reactant() + ":"))
            .map(s -> s.substring(s.indexOf(':') + 1)).anyMatch(label -> m.symmetryClass(m.atomLabelled(label).orElseThrow()) == m.symmetryClass(atom));
    }

    static List<Row> rows() throws IOException {
        List<Row> rows = new ArrayList<>();
        try (InputStream in = ReactionSetTest.class.getResourceAsStream("/lyate/sheet/reactions.csv");
                BufferedReader lines = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
            lines.lines().filter(line -> !line.startsWith("#")).skip(1).forEach(line -> {
                String[] cells = line.split("\\|");
                rows.add(new Row(cells[0], cells[1], cells[2], cells[3], Set.of(cells[4].split(" ")), cells[5]));
            });
        }
        return rows;
    }
}
