package lyate.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import lyate.table.Schema;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every rule is reached by its own example, is not set off by its counter-example, and is shadowed by no later row. */
class RuleTablesTest {

    private static final RuleExamples EXAMPLES = RuleExamples.load(TableFolders.packaged());

    static Stream<SideReactionRule> sideReactions() {
        return EXAMPLES.sideReactions().rules().stream();
    }

    static Stream<BaseSolventRules.Rule> solventRules() {
        return EXAMPLES.solventRules().rules().stream();
    }

    static Stream<BaseHazards.Rule> hazards() {
        return EXAMPLES.hazards().rules().stream();
    }

    static Stream<AcidHazards.Rule> acidHazards() {
        return EXAMPLES.acidHazards().rules().stream();
    }

    @Test
    void thereAreRulesEnough() {
        assertTrue(sideReactions().count() >= 150, sideReactions().count() + " side reactions");
        assertTrue(solventRules().count() >= 90, solventRules().count() + " rules of base and solvent");
    }

    @ParameterizedTest
    @MethodSource("sideReactions")
    void aSideReactionIsRaisedByItsHitAlone(SideReactionRule rule) throws Exception {
        assertTrue(EXAMPLES.decides(rule, rule.hit()), rule.id() + " is not what decides for " + rule.hit());
        assertFalse(EXAMPLES.decides(rule, rule.miss()), rule.id() + " is raised by " + rule.miss());
    }

    @ParameterizedTest
    @MethodSource("solventRules")
    void aSolventRuleIsRaisedByItsHitAlone(BaseSolventRules.Rule rule) throws Exception {
        assertTrue(EXAMPLES.decides(rule, rule.hit()), rule.id() + " is not what decides for " + rule.hit());
        assertFalse(EXAMPLES.decides(rule, rule.miss()), rule.id() + " is raised by " + rule.miss());
    }

    @ParameterizedTest
    @MethodSource("hazards")
    void aHazardIsRaisedByItsHitAlone(BaseHazards.Rule rule) throws Exception {
        assertTrue(EXAMPLES.decides(rule, rule.hit()), rule.id() + " is not what decides for " + rule.hit());
        assertFalse(EXAMPLES.decides(rule, rule.miss()), rule.id() + " is raised by " + rule.miss());
    }

    @ParameterizedTest
    @MethodSource("acidHazards")
    void anAcidHazardIsRaisedByItsHitAlone(AcidHazards.Rule rule) throws Exception {
        assertTrue(EXAMPLES.decides(rule, rule.hit()), rule.id() + " is not what decides for " + rule.hit());
        assertFalse(EXAMPLES.decides(rule, rule.miss()), rule.id() + " is raised by " + rule.miss());
    }

    @Test
    void aRowOfTheUsersOwnWithSoundExamplesIsAccepted(@TempDir Path folder) throws IOException {
        write(folder, "O=C1CCCCC1|LDA|THF|-78", "O=C1CCCCC1|n-BuLi|THF|-78");
        assertEquals(List.of(), RuleExamples.load(TableFolders.overlaidBy(folder)).problemsOfOwnRows());
    }

    @Test
    void examplesOfTheUsersOwnThatDoNotFitAreNamed(@TempDir Path folder) throws IOException {
        write(folder, "O=C1CCCCC1|n-BuLi|THF|-78", "O=C1CCCCC1|LDA|THF|-78");
        List<String> problems = RuleExamples.load(TableFolders.overlaidBy(folder)).problemsOfOwnRows();
        assertEquals(2, problems.size(), problems.toString());
        assertTrue(problems.get(0).contains("side-reactions.csv:3") && problems.get(0).contains("does not end in this row"),
                problems.get(0));
    }

    @Test
    void anExampleThatCannotBeReadIsNamed(@TempDir Path folder) throws IOException {
        write(folder, "O=C1CCCCC1|no such base|THF|-78", "O=C1CCCCC1|n-BuLi|THF|-78");
        List<String> problems = RuleExamples.load(TableFolders.overlaidBy(folder)).problemsOfOwnRows();
        assertEquals(1, problems.size(), problems.toString());
        assertTrue(problems.get(0).contains("no base called 'no such base'"), problems.get(0));
    }

    private static void write(Path folder, String hit, String miss) throws IOException {
        Schema schema = SideReactionTable.SCHEMA;
        Files.writeString(folder.resolve(schema.fileName()), "# version: 1\n"
                + String.join(",", schema.columns().stream().map(column -> column.name()).toList())
                + "\nmine,base,substrate,[CX3](=O)([#6])[#6],lda,,,,,,,,,none,,,,,,isomerisation,note,no,An invented remark.,own,"
                + hit + "," + miss + "\n");
    }
}
