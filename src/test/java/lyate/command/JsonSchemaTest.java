package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import com.networknt.schema.ValidationMessage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.report.ReviewJson;
import lyate.review.FindingKind;
import lyate.review.Verdict;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The JSON that the program writes, the schema in docs and the page that explains it say the same. */
class JsonSchemaTest {

    private static final ObjectMapper JSON = new ObjectMapper();
    private static final JsonNode SCHEMA = read(Path.of("docs/json.schema.json"));
    private static final String CHECK = "check --base LDA --solvent THF --temperature -78 --site C5 --electrophile CI --format json --substrate ";
    private static final String KETO_ESTER = "CC(=O)CC(=O)OCC";

    @TempDir
    private Path folder;

    @Test
    void aCheckIsWrittenAsTheSchemaSays() {
        assertSound("review", run((CHECK + "[Na+].O=C1CCCCC1C(=O)[O-]").replace("--site C5 ", "").split(" ")));
    }

    @Test
    void aReviewedSheetIsWrittenAsTheSchemaSays() throws IOException {
        Path sheet = folder.resolve("sheet.csv");
        Files.writeString(sheet, Files.readString(Path.of("docs/example-route.csv")) + "bad,C(,,LDA,1,THF,,,,,,\n");
        Path result = folder.resolve("result.json");
        run("review", sheet.toString(), "-o", result.toString());
        JsonNode rows = read(result);
        assertEquals(13, rows.size());
        assertSound("row", rows);
    }

    @Test
    void amountsOfASheetAreWrittenAsTheSchemaSays() throws IOException {
        Path sheet = Files.writeString(folder.resolve("sheet.csv"), "substrate,base,solvent,base_equiv,amount_g,base_titrated_M\n"
                + "[Na+].CC(=O)CC(=O)[O-],NaH,THF,2.2,5,\nCC(C)=O,n-BuLi,THF,1.05,\"0,58\",1.45\nCC(C)=O,LDA,THF,1.05,,\n");
        Path result = folder.resolve("result.json");
        run("review", sheet.toString(), "-o", result.toString());
        JsonNode rows = read(result);
        assertSound("row", rows);
        // 0.58 g of propanone, 58.08 g/mol; 1.05 equivalents of it in a solution of 1.45 mol/L
        assertEquals(9.986, rows.get(1).at("/amounts/substrate_mmol").asDouble(), 0.002);
        assertEquals(1.05 * 9.986 / 1.45, rows.get(1).at("/amounts/base/mL").asDouble(), 0.002);
        assertFalse(rows.get(2).has("amounts"));
    }

    @Test
    void sitesAreWrittenAsTheSchemaSays() {
        assertSound("answer", run("sites", "--format", "json", "--solvent", "DMSO", KETO_ESTER, "Nc1ccccc1", "C("));
    }

    @Test
    void aRankingIsWrittenAsTheSchemaSays() {
        assertSound("ranking", run("bases", "--format", "json", "--top", "3", "--solvent", "THF", "--substrate", KETO_ESTER));
    }

    @Test
    void whatTheBenchSaysIsWrittenAsTheSchemaSays() {
        assertSound("review", run("check", "--substrate", "OC(=O)c1ccccc1", "--base", "K2CO3", "--solvent", "DMF", "--format", "json",
                "--amount", "2 g", "--product", "COC(=O)c1ccccc1", "--separate-from", "benzoic acid"));
    }

    @Test
    void protonationsAndTheirRankingAreWrittenAsTheSchemaSays() {
        assertSound("protonation", run("check", "--acid", "TFA", "--format", "json", "--solvent", "acetone", "--substrate", "CCN(CC)CC"));
        assertSound("acid_ranking", run("acids", "--format", "json", "--top", "3", "--solvent", "acetone", "--substrate", "CCN(CC)CC"));
    }

    @Test
    void aNameThatIsNotInTheSchemaIsNoticed() {
        JsonNode answer = run((CHECK.replace("C5", "C4") + KETO_ESTER).split(" "));
        ((ObjectNode) answer.get(0).get("step")).put("colour", "red");
        assertFalse(complaints("review", answer).isEmpty());
    }

    @Test
    void aNameThatIsMissingIsNoticed() {
        JsonNode answer = run((CHECK.replace("C5", "C4") + KETO_ESTER).split(" "));
        ((ObjectNode) answer.get(0)).remove("log_k");
        assertFalse(complaints("review", answer).isEmpty());
    }

    @Test
    void versionAndVerdictsAreTheProgramsOwn() {
        JsonNode review = SCHEMA.at("/$defs/review/properties");
        assertEquals(ReviewJson.SCHEMA, review.at("/schema/const").asText());
        List<String> verdicts = new ArrayList<>();
        review.at("/verdict/enum").forEach(code -> verdicts.add(code.asText()));
        assertEquals(Stream.of(Verdict.values()).map(Verdict::code).toList(), verdicts);
    }

    @Test
    void thePageExplainsEveryName() throws IOException {
        String page = Files.readString(Path.of("docs/json.md"));
        assertTrue(page.contains("`" + ReviewJson.SCHEMA + "`"));
        Set<String> names = new TreeSet<>();
        SCHEMA.get("$defs").forEach(object -> object.path("properties").fieldNames().forEachRemaining(names::add));
        assertTrue(names.size() > 40, names.toString());
        assertEquals(List.of(), names.stream().filter(name -> !page.contains("| `" + name + "` |")).toList());
    }

    @Test
    void thePageExplainsEveryKindOfFinding() throws IOException {
        String page = Files.readString(Path.of("docs/json.md"));
        assertEquals(List.of(), Stream.of(FindingKind.values()).map(FindingKind::code)
                .filter(code -> !page.contains("| `" + code + "` |")).toList());
    }

    private static void assertSound(String kind, JsonNode array) {
        assertTrue(array.isArray() && !array.isEmpty(), "an array with something in it");
        assertEquals("", complaints(kind, array));
    }

    /** Every element against its own part of the schema, because that names the culprit. */
    private static String complaints(String kind, JsonNode array) {
        ObjectNode part = SCHEMA.deepCopy();
        part.remove("anyOf");
        part.putObject("items").put("$ref", "#/$defs/" + kind);
        JsonSchema schema = JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012).getSchema(part);
        return schema.validate(array).stream().map(ValidationMessage::getMessage).limit(5).collect(Collectors.joining("\n"));
    }

    private static JsonNode run(String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Lyate.run(Terminal.of(new ByteArrayInputStream(new byte[0]), out, err, false), arguments);
        try {
            return JSON.readTree(out.toString(StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new AssertionError(out + "\n" + err, e);
        }
    }

    private static JsonNode read(Path file) {
        try {
            return JSON.readTree(Files.readString(file));
        } catch (IOException e) {
            throw new AssertionError(e.getMessage(), e);
        }
    }
}
