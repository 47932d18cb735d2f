package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What changed between two route sheets, or between two sets of tables, and why. */
class CompareCommandTest {

    private static final String HEADER = "step,substrate,site,base,base_equiv,solvent,temperature_C\n";
    private static final String ALKYLATION = "S1,CC(=O)CC(=O)OC,C4,";

    @TempDir
    private Path folder;

    /** What a run left behind. */
    private record Run(int code, String out, String err) {}

    @Test
    void aSheetDoesNotDifferFromItself() throws IOException {
        Path sheet = sheet("same.csv", ALKYLATION + "sodium hydride,1.05,THF,0\n");
        Run run = run("compare", sheet.toString(), sheet.toString());
        assertEquals(new Run(0, "1 step: 1 same\n", ""), run);
    }

    @Test
    void anotherSolventThatDestroysTheBaseIsNamedAsTheReason() throws IOException {
        Path old = sheet("old.csv", ALKYLATION + "sodium hydride,1.05,THF,0\n");
        Path late = sheet("new.csv", ALKYLATION + "sodium hydride,1.05,methanol,0\n");
        CSVRecord row = only(run("compare", old.toString(), late.toString(), "--format", "csv").out());
        assertEquals("verdict changed", row.get("change"));
        assertEquals("selective", row.get("old_verdict"));
        assertEquals("levelled", row.get("new_verdict"));
        assertTrue(row.get("findings_gained").contains("levelled"), row.get("findings_gained"));
        assertTrue(row.get("why").startsWith("sheet, solvent: THF \u2192 methanol"), row.get("why"));
    }

    @Test
    void stepsAreMatchedByNameNotByPlace() throws IOException {
        String one = "A,CC(C)=O,,LDA,1.05,THF,-78\n";
        String other = "B,c1ccccc1O,,sodium hydroxide,1,water,25\n";
        Run run = run("compare", sheet("old.csv", one + other).toString(), sheet("new.csv", other + one).toString());
        assertEquals("2 steps: 2 same\n", run.out());
    }

    @Test
    void stepsThatCameAndWentAreSaidSo() throws IOException {
        Run run = run("compare", sheet("old.csv", "A,CC(C)=O,,LDA,1.05,THF,-78\n").toString(),
                sheet("new.csv", "B,CC(C)=O,,LDA,1.05,THF,-78\n").toString());
        assertTrue(run.out().startsWith("2 steps: 1 added; 1 removed\n"), run.out());
        assertTrue(run.out().contains("\nB  added: "), run.out());
        assertTrue(run.out().contains("\nA  removed: "), run.out());
    }

    /** 9.99: what phenol has in water (CRC Handbook of Chemistry and Physics); the own table pretends to know otherwise. */
    @Test
    void anotherSetOfTablesIsNamedAsTheReason() throws IOException {
        Path sheet = sheet("phenol.csv", "S1,Oc1ccccc1,O1,sodium hydroxide,1,water,25\n");
        Path tables = Files.createDirectory(folder.resolve("tables"));
        String packaged = new String(CompareCommandTest.class.getResourceAsStream("/reagent-tables/bases.csv").readAllBytes(), StandardCharsets.UTF_8);
        List<String> lines = packaged.lines().toList();
        String header = lines.stream().filter(line -> line.startsWith("id,")).findFirst().orElseThrow();
        String row = lines.stream().filter(line -> line.startsWith("naoh,")).findFirst().orElseThrow();
        CSVRecord cells = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get().parse(new StringReader(header + "\n" + row + "\n"))
                .getRecords().get(0);
        String known = cells.get("pka_water");
        Files.writeString(tables.resolve("bases.csv"), "# A weaker hydroxide, for the test.\n# version: 1\n" + header + "\n"
                + row.replaceFirst("," + known.replace(".", "\\.") + ",", ",9.0,") + "\n");
        Run run = run("compare", sheet.toString(), "--against", tables.toString());
        assertTrue(run.out().contains("S1  selective \u2192 partial"), run.out() + run.err());
        assertTrue(run.out().contains("pKa of the conjugate acid of sodium hydroxide in water: "), run.out());
    }

    @Test
    void aRowThatCannotBeUsedIsAChangeToo() throws IOException {
        Run run = run("compare", sheet("old.csv", "A,CC(C)=O,,LDA,1.05,THF,-78\n").toString(), sheet("new.csv", "A,C(,,LDA,1.05,THF,-78\n").toString());
        assertEquals(1, run.code());
        assertTrue(run.out().contains("A  selective \u2192 not-judged"), run.out());
        assertTrue(run.err().contains("row 1 (A, line 2)"), run.err());
    }

    @Test
    void oneSheetAloneIsWrongUsage() throws IOException {
        Run run = run("compare", sheet("old.csv", "").toString());
        assertEquals(2, run.code());
        assertTrue(run.err().contains("expected a second sheet or --against"), run.err());
    }

    private Path sheet(String name, String rows) throws IOException {
        return Files.writeString(folder.resolve(name), HEADER + rows);
    }

    private static CSVRecord only(String csv) throws IOException {
        List<CSVRecord> rows = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get().parse(new StringReader(csv)).getRecords();
        assertEquals(1, rows.size());
        return rows.get(0);
    }

    private static Run run(String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), arguments);
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }
}
