package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The command line: results on standard output, words on standard error, exit codes as promised. */
class LyateTest {

    @TempDir
    private Path folder;

    /** What a run left behind. */
    private record Run(int code, String out, String err) {}

    @Test
    void sitesAsCsvHasThePromisedColumns() throws IOException {
        Run run = run("", "sites", "--format", "csv", "CC(=O)O");
        assertEquals(0, run.code());
        assertEquals("row,input,role,site,element,hydrogens,site_class,solvent,pka,sigma,basis,source", run.out().lines().findFirst().orElseThrow());
        CSVRecord acid = csv(run.out()).stream().filter(row -> row.get("site").equals("O4") && row.get("role").equals("acid")).findFirst().orElseThrow();
        // 4.76: CRC Handbook of Chemistry and Physics (from memory)
        assertEquals(4.76, Double.parseDouble(acid.get("pka")), 0.05);
        assertEquals(List.of("1", "CC(=O)O", "O", "1", "water", "measured"),
                Stream.of("row", "input", "element", "hydrogens", "solvent", "basis").map(acid::get).toList());
    }

    @Test
    void sitesInTextSaysWhichRowOfTheTableMatched() {
        Run run = run("", "sites", "Oc1ccccc1");
        assertTrue(run.out().contains("class phenol-oh, "), run.out());
        assertTrue(run.out().contains("measured"), run.out());
    }

    @Test
    void explainedSitesAreTakenApartInText() {
        String text = run("", "sites", "--explain", "--estimate-only", "COc1ccc(O)cc1").out();
        assertTrue(text.contains("class value: alkoxy or amino phenol O-H"), text);
        assertTrue(text.contains("aromatic ring"), text);
        assertTrue(text.lines().anyMatch(line -> line.matches(" +[-+]?\\d+\\.\\d\\d  resonance .*\\[.*O2.*]")), text);
        assertTrue(text.contains("measured relative: "), text);
        assertTrue(text.contains("uncertainty: "), text);
        assertFalse(run("", "sites", "--estimate-only", "COc1ccc(O)cc1").out().contains("uncertainty: "));
    }

    @Test
    void explainedSitesAreTakenApartInCsv() throws IOException {
        List<CSVRecord> rows = csv(run("", "sites", "--explain", "--estimate-only", "--format", "csv", "COc1ccc(O)cc1", "C(").out());
        List<CSVRecord> phenol = rows.stream().filter(row -> row.get("site").equals("O7") && row.get("role").equals("acid")).toList();
        double sum = phenol.stream().filter(row -> row.get("part").equals("contribution")).mapToDouble(row -> Double.parseDouble(row.get("value"))).sum();
        CSVRecord pKa = phenol.stream().filter(row -> row.get("part").equals("pka")).findFirst().orElseThrow();
        // the terms are rounded to two decimals each
        assertEquals(Double.parseDouble(pKa.get("value")), sum, 0.005 * phenol.size());
        assertTrue(phenol.stream().anyMatch(row -> row.get("effect").equals("resonance") && row.get("atoms").contains("O2")), phenol.toString());
        assertEquals(List.of("uncertainty"), phenol.stream().skip(phenol.size() - 1L).map(row -> row.get("part")).toList());
        assertEquals("refused", rows.get(rows.size() - 1).get("part"));
    }

    @Test
    void aSiteThatDoesNotExistIsAnsweredWithTheProtons() {
        String err = run("", "check", "--substrate", "CC(=O)OCC", "--base", "LDA", "--solvent", "THF", "--site", "C99").err();
        assertTrue(err.contains("there is no atom 'C99' in the substrate; its protons are on C1, C5, C6"), err);
    }

    @Test
    void estimateOnlyLeavesMeasuredValuesOut() throws IOException {
        Run run = run("", "sites", "--estimate-only", "--format", "csv", "CC(=O)O");
        assertTrue(csv(run.out()).stream().noneMatch(row -> row.get("basis").equals("measured")));
    }

    @Test
    void sitesReadsOneStructurePerLineAndLosesNone() throws IOException {
        Run run = run("CCO\n\nnot a structure\nC(\nacetone\n", "sites", "--format", "csv", "--solvent", "DMSO", "-");
        assertEquals(1, run.code());
        List<CSVRecord> rows = csv(run.out());
        assertEquals(List.of("1", "3", "4", "5"), rows.stream().map(row -> row.get("row")).distinct().toList());
        assertEquals(List.of("3", "4"), rows.stream().filter(row -> row.get("basis").equals("refused")).map(row -> row.get("row")).toList());
        assertTrue(run.err().contains("row 3: neither SMILES nor a systematic name"), run.err());
        assertTrue(run.err().contains("row 4: not SMILES: unclosed branch detected, SMILES may be truncated\nC(\n ^"), run.err());
    }

    @Test
    void sitesAsJson() throws IOException {
        JsonNode answers = new ObjectMapper().readTree(run("", "sites", "--format", "json", "[Na+].CC(=O)[O-]", "C(").out());
        assertEquals("[Na+]", answers.get(0).get("set_aside").get(0).asText());
        assertTrue(answers.get(0).get("sites").size() > 1);
        assertTrue(answers.get(1).get("refused").asText().startsWith("not SMILES"));
    }

    @Test
    void checkInWords() {
        Run run = run("", "check", "--substrate", "CC(=O)CC(=O)OCC", "--base", "NaOEt", "--solvent", "EtOH");
        assertEquals(0, run.code());
        assertTrue(run.out().startsWith("selective ("), run.out());
        assertTrue(run.out().contains("intended site  C4"), run.out());
    }

    @Test
    void checkAsJsonNamesItsSchema() throws IOException {
        JsonNode review = new ObjectMapper().readTree(run("", "check", "--substrate", "CC(C)=O", "--base", "LDA", "--solvent", "THF",
                "--temperature", "-78", "--equiv", "1.1", "--format", "JSON").out()).get(0);
        assertEquals("lyate-review/1", review.get("schema").asText());
        assertEquals("selective", review.get("verdict").asText());
        assertEquals(-78, review.get("step").get("temperature_C").asInt());
        assertTrue(review.get("transfers").size() > 0);
    }

    @Test
    void checkNamesTheOptionAtFault() {
        Run run = run("", "check", "--substrate", "CC(C)=O", "--base", "sodium hydryde", "--solvent", "THF", "--water-ppm", "wet");
        assertEquals(1, run.code());
        assertEquals("", run.out());
        assertTrue(run.err().contains("--base: no base called 'sodium hydryde' in the tables; nearest: sodium hydride"), run.err());
        assertTrue(run.err().contains("--water-ppm: found 'wet', expected a number from 0 to 1000000 (mass ppm)"), run.err());
    }

    @Test
    void basesRanksTheStockroom() throws IOException {
        Run run = run("", "bases", "--substrate", "Oc1ccccc1", "--solvent", "DMF", "--top", "5", "--format", "csv");
        assertEquals(0, run.code());
        List<CSVRecord> rows = csv(run.out());
        assertEquals(List.of("1", "2", "3", "4", "5"), rows.stream().map(row -> row.get("rank")).toList());
        assertEquals("selective", rows.get(0).get("verdict"));
        assertEquals(2, run("", "bases", "--solvent", "DMF").code());
        assertEquals(1, run("", "bases", "--substrate", "ClC(Cl)(Cl)Cl", "--solvent", "DMF").code());
    }

    @Test
    void reviewAddsItsColumnsAndPassesOthersThrough() throws IOException {
        Path sheet = Files.writeString(folder.resolve("route.csv"), "\uFEFFmine;step;substrate;base;solvent;verdict\r\n"
                + "=SUM(A1);A;CC(C)=O;LDA;THF;old\r\n;B;CC(C;LDA;THF;\r\n-5;C;Oc1ccccc1;NaH;DMF;\r\n");
        Path result = folder.resolve("result.csv");
        Run run = run("", "review", sheet.toString(), "-o", result.toString(), "--threads", "2");
        assertEquals(1, run.code());
        assertTrue(run.err().startsWith("row 2 (B, line 3): column substrate: not SMILES"), run.err());
        assertTrue(run.err().contains("3 rows, 1 of them could not be used"), run.err());
        String text = Files.readString(result);
        assertEquals("mine,step,substrate,base,solvent,verdict,probability,log_k,first_site,intended_percent,other_percent,findings",
                text.lines().findFirst().orElseThrow());
        List<CSVRecord> rows = csv(text);
        assertEquals(List.of("'=SUM(A1)", "", "-5"), rows.stream().map(row -> row.get("mine")).toList());
        assertEquals(List.of("selective", "", "selective"), rows.stream().map(row -> row.get("verdict")).toList());
        assertFalse(Files.exists(folder.resolve("result.csv.part")));
    }

    @Test
    void columnsTheProgramDoesNotKnowPassThroughToTheLetter() throws IOException {
        String kept = "  two blanks ,\"a \"\"b\"\";c\",\"line 1\nline 2 \",\u00e9\u6f22,1e5";
        Run run = run("# mine\nz,substrate,y,x,base,w,solvent,v\n" + kept.replaceFirst(",", ", CC(C)=O ,").replace(",\u00e9", ",LDA,\u00e9").replace(",1e5", ",THF,1e5") + "\n",
                "review", "-");
        assertEquals(0, run.code());
        assertTrue(run.out().startsWith("z,substrate,y,x,base,w,solvent,v,verdict,"), run.out());
        CSVRecord row = csv(run.out()).get(0);
        assertEquals(List.of("  two blanks ", "a \"b\";c", "line 1\nline 2 ", "\u00e9\u6f22", "1e5"), Stream.of("z", "y", "x", "w", "v").map(row::get).toList());
    }

    @Test
    void reviewStreamsFromStandardInput() throws IOException {
        Run run = run("reaction\nCC(C)=O>CC(C)[N-]C(C)C.[Li+].C1CCOC1>C\n", "review", "-");
        assertEquals(0, run.code());
        assertEquals("selective", csv(run.out()).get(0).get("verdict"));
    }

    @Test
    void reviewAsJsonKeepsWhatWasGiven() throws IOException {
        Path sheet = Files.writeString(folder.resolve("route.csv"), "substrate,base,solvent,mine\nCC(C)=O,LDA,THF,x\n,LDA,THF,y\n");
        Path result = folder.resolve("result.json");
        assertEquals(1, run("", "review", sheet.toString(), "-o", result.toString()).code());
        JsonNode rows = new ObjectMapper().readTree(Files.readString(result));
        assertEquals("x", rows.get(0).get("given").get("mine").asText());
        assertEquals("selective", rows.get(0).get("review").get("verdict").asText());
        assertEquals("column substrate: there is no structure: the text is empty", rows.get(1).get("problem").asText());
    }

    @Test
    void accuracyComparesWithMeasuredValues() throws IOException {
        Path file = Files.writeString(folder.resolve("mine.csv"), "smiles,solvent,pka\nCC(=O)O,water,4.76\nCC(,water,3\n");
        Run run = run("", "accuracy", file.toString());
        assertEquals(1, run.code());
        assertTrue(run.err().startsWith("line 3: "), run.err());
        assertFalse(run.out().isBlank());
    }

    @Test
    void tablesListsEveryTable() {
        Run run = run("", "tables");
        assertEquals(0, run.code());
        assertTrue(run.out().lines().anyMatch(line -> line.matches("bases\\.csv +\\d+ rows +version 1 +packaged")), run.out());
    }

    @Test
    void tablesChecksAFolder() throws IOException {
        assertEquals(0, run("", "tables", "--check", folder.toString()).code());
        Files.writeString(folder.resolve("base.csv"), "# version: 1\n");
        Files.writeString(folder.resolve("normalisations.csv"), "# version: 1\nid,what\n");
        Run run = run("", "tables", "--check", folder.toString());
        assertEquals(1, run.code());
        assertTrue(run.err().contains("base.csv: there is no table of this name; nearest: bases.csv"), run.err());
        assertTrue(run.err().contains("normalisations.csv:2: column transformation: found 'no such column'"), run.err());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "sites|lyate sites: Missing required parameter: 'STRUCTURE'",
        "sites --format xml C|lyate sites: Invalid value for option '--format': found 'xml', expected text, csv or json",
        "sites --solvent watre C|lyate sites: --solvent: no solvent called 'watre' in the tables; nearest: water",
        "sites --tables nowhere C|lyate sites: there is no folder nowhere",
        "check --base LDA --solvent THF|lyate check: Error: Missing required argument (specify one of these): (--substrate=X",
        "check --substrate CC --solvent THF|lyate check: Missing required option: (--base=B",
        "check --substrate CC --base LDA|lyate check: Missing required option: '--solvent=S'",
        "review sheet.csv --threads 0|lyate review: --threads: found 0, expected at least 1",
        "sits C|lyate: Unmatched arguments from index 0: 'sits', 'C'",
        "tables --check nowhere|lyate tables: there is no folder nowhere",
    })
    void wrongUsage(String arguments, String message) {
        Run run = run("", arguments.split(" "));
        assertEquals(2, run.code());
        assertTrue(run.err().startsWith(message), run.err());
        assertEquals("", run.out());
        assertFalse(run.err().contains("\tat "), run.err());
    }

    @ParameterizedTest
    @ValueSource(strings = {"nowhere.csv", "folder"})
    void filesThatCannotBeRead(String name) throws IOException {
        Files.createDirectory(folder.resolve("folder"));
        Run run = run("", "review", folder.resolve(name).toString());
        assertEquals(1, run.code());
        assertTrue(run.err().startsWith("lyate review: "), run.err());
        assertFalse(run.err().contains("Exception"), run.err());
    }

    @Test
    void lettersThatAreNotUtf8CostTheirRow() throws IOException {
        Path sheet = Files.write(folder.resolve("latin.csv"), "substrate,base,solvent,notes\nCCO,NaH,THF,d\u00e9j\u00e0\nCCO,NaH,THF,ici\n"
                .getBytes(StandardCharsets.ISO_8859_1));
        Run run = run("", "review", sheet.toString());
        assertEquals(1, run.code());
        assertTrue(run.err().startsWith("row 1 (line 2): the input is not UTF-8 text; save it as CSV UTF-8"), run.err());
        assertTrue(run.out().contains("CCO,NaH,THF,ici,selective"), run.out());
    }

    @Test
    void sheetInAnotherEncodingAltogetherIsRefusedInWords() throws IOException {
        Path sheet = Files.write(folder.resolve("wide.csv"), "substrate,notes\nCCO,x\n".getBytes(StandardCharsets.UTF_16));
        Run run = run("", "review", sheet.toString());
        assertEquals(1, run.code());
        assertEquals("lyate review: the input is not UTF-8 text; save it as CSV UTF-8\n", run.err().replace("\r", ""));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "sites", "check", "review", "bases", "accuracy", "tables"})
    void helpIsThere(String command) {
        Run run = run("", Stream.of(command, "--help").filter(word -> !word.isEmpty()).toArray(String[]::new));
        assertEquals(0, run.code());
        assertTrue(run.out().startsWith("Usage: lyate"), run.out());
    }

    @Test
    void resultsAreTheSameInEveryLocale() {
        Locale before = Locale.getDefault();
        String[] command = {"check", "--substrate", "OC(=O)CC#N", "--base", "TRIETHYLAMINE", "--solvent", "DICHLOROMETHANE"};
        String expected = run("", command).out();
        try {
            for (String language : List.of("tr", "de", "ar-u-nu-arab", "th-TH-u-nu-thai")) {
                Locale.setDefault(Locale.forLanguageTag(language));
                assertEquals(expected, run("", command).out());
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    private static Run run(String in, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Lyate.run(Terminal.of(new ByteArrayInputStream(in.getBytes(StandardCharsets.UTF_8)), out, err, false), arguments);
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    private static List<CSVRecord> csv(String text) throws IOException {
        return CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get().parse(new StringReader(text)).getRecords();
    }
}
