package lyate.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StockroomTest {

    private static final Stockroom STOCKROOM = Stockroom.load(TableFolders.packaged());

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            n-BuLi|n-buli
            n-butyllithium|n-buli
            butyl lithium|n-buli
            BuLi|n-buli
            sec-butyllithium|s-buli
            s-BuLi|s-buli
            tert-butyllithium|t-buli
            t-BuLi|t-buli
            MeLi|meli
            NaH|nah
            sodium hydride|nah
            KH|kh
            KOtBu|kotbu
            t-BuOK|kotbu
            potassium tert-butoxide|kotbu
            potassium t-butoxide|kotbu
            KOt-Bu|kotbu
            sodium tert-butoxide|naotbu
            sodium methoxide|naome
            NaOMe|naome
            sodium ethoxide|naoet
            K2CO3|k2co3
            K₂CO₃|k2co3
            potassium carbonate|k2co3
            cesium carbonate|cs2co3
            caesium carbonate|cs2co3
            sodium bicarbonate|nahco3
            NaHCO3|nahco3
            potassium phosphate|k3po4
            sodium acetate|naoac
            sodium hydroxide|naoh
            potassium hydroxide|koh
            LiOH|lioh
            Et3N|et3n
            triethylamine|et3n
            TEA|et3n
            Hunig base|dipea
            Hünig's base|dipea
            Hünig’s base|dipea
            DIPEA|dipea
            i-Pr2NEt|dipea
            LDA|lda
            lithium diisopropylamide|lda
            LiHMDS|lihmds
            LHMDS|lihmds
            NaHMDS|nahmds
            KHMDS|khmds
            LiTMP|litmp
            sodium amide|nanh2
            NaNH2|nanh2
            ammonia|nh3
            pyridine|pyridine
            piperidine|piperidine
            imidazole|imidazole
            2,6-lutidine|2-6-lutidine
            DMAP|dmap
            DBU|dbu
            DABCO|dabco
            TBAF|tbaf
            ethylmagnesium bromide|etmgbr
            methylmagnesium bromide|memgbr
            iPrMgCl·LiCl|iprmgcl-licl
            TMPMgCl·LiCl|tmpmgcl-licl
            TMPZnCl·LiCl|tmpzncl-licl
            P4-t-Bu|p4-tbu
            """)
    void aBaseAnswersToEveryNameTheTradeUses(String name, String id) throws UnknownNameException {
        assertEquals(id, STOCKROOM.base(name).id());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            THF|thf
            tetrahydrofuran|thf
            DMSO|dmso
            DMF|dmf
            DMAc|dmac
            DMA|dmac
            NMP|nmp
            MeCN|mecn
            acetonitrile|mecn
            dichloromethane|dcm
            DCM|dcm
            CH2Cl2|dcm
            chloroform|chloroform
            diethyl ether|et2o
            ether|et2o
            1,2-dimethoxyethane|dme
            dioxane|dioxane
            1,4-dioxane|dioxane
            water|water
            methanol|meoh
            ethanol|etoh
            isopropanol|iproh
            2-propanol|iproh
            tert-butanol|tbuoh
            t-BuOH|tbuoh
            toluene|toluene
            hexanes|hexane
            ethyl acetate|etoac
            acetone|acetone
            ammonia|nh3-liq
            2-MeTHF|2-methf
            MTBE|mtbe
            HMPA|hmpa
            """)
    void aSolventAnswersToEveryNameTheTradeUses(String name, String id) throws UnknownNameException {
        assertEquals(id, STOCKROOM.solvent(name).id());
    }

    @Test
    void anUnknownNameIsAnsweredWithTheNearestKnownOnes() {
        UnknownNameException base = assertThrows(UnknownNameException.class, () -> STOCKROOM.base("sodium hydrid"));
        assertTrue(base.getMessage().contains("'sodium hydrid'"), base.getMessage());
        assertTrue(base.getMessage().contains("sodium hydride"), base.getMessage());
        UnknownNameException solvent = assertThrows(UnknownNameException.class, () -> STOCKROOM.solvent("tolune"));
        assertTrue(solvent.getMessage().contains("toluene"), solvent.getMessage());
    }

    @ParameterizedTest
    @CsvSource({"nah, nah", "KOt, kotbu", "lithium di, lda", "buli, n-buli", "K2, k2co3", "hunig, dipea", "Et3, et3n"})
    void theLikeliestBaseComesFirstWhileTyping(String typed, String first) {
        assertEquals(first, STOCKROOM.searchBases(typed, 5).get(0).id());
    }

    @ParameterizedTest
    @CsvSource({"th, thf", "methan, meoh", "CH2Cl2, dcm", "tolu, toluene", "dimethyl sulf, dmso"})
    void theLikeliestSolventComesFirstWhileTyping(String typed, String first) {
        assertEquals(first, STOCKROOM.searchSolvents(typed, 5).get(0).id());
    }

    @Test
    void aSearchKeepsItsLimitAndAnEmptyTextShowsTheShelf() {
        assertEquals(3, STOCKROOM.searchBases("lithium", 3).size());
        assertEquals("n-buli", STOCKROOM.searchBases("", 4).get(0).id());
        assertEquals(List.of(), STOCKROOM.searchSolvents("no such thing", 4));
    }

    @Test
    void aRowOfTheUsersOwnFolderAddsABase(@TempDir Path folder) throws IOException, UnknownNameException {
        Files.writeString(folder.resolve("bases.csv"), ownTable("my-base,my base,MyB,alkoxide"));
        Stockroom own = Stockroom.load(TableFolders.overlaidBy(folder));
        assertEquals(STOCKROOM.bases().size() + 1, own.bases().size());
        assertEquals(31.0, own.base("myb").pKa(Medium.DMSO).orElseThrow().pKa());
    }

    @Test
    void anUnknownFamilyIsAnsweredWithTheNearestOnes(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("bases.csv"), ownTable("my-base,my base,MyB,alkoxid"));
        TableException e = assertThrows(TableException.class, () -> Stockroom.load(TableFolders.overlaidBy(folder)));
        assertEquals("family", e.problems().get(0).column());
        assertTrue(e.getMessage().contains("alkoxide"), e.getMessage());
    }

    @Test
    void aMisdrawnStructureOfTheUsersOwnIsRefusedInWords(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("bases.csv"), ownTable("my-base,my base,MyB,alkoxide").replace("OCC1CC1,", "OCC1CC,"));
        TableException e = assertThrows(TableException.class, () -> Stockroom.load(TableFolders.overlaidBy(folder)));
        assertEquals(List.of("conjugate_acid"), e.problems().stream().map(problem -> problem.column()).toList());
    }

    @Test
    void aWrongMolarMassOfTheUsersOwnIsAnsweredWithTheRightOne(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("bases.csv"), ownTable("my-base,my base,MyB,alkoxide").replace("94.09", "49.09"));
        TableException e = assertThrows(TableException.class, () -> Stockroom.load(TableFolders.overlaidBy(folder)));
        assertTrue(e.getMessage().contains("94.09, the molar mass of the structure"), e.getMessage());
    }

    @Test
    void aPackagedHydrideCanBeReplaced(@TempDir Path folder) throws IOException, UnknownNameException {
        String header = String.join(",", BaseTable.BASES.columns().stream().map(column -> column.name()).toList());
        Files.writeString(folder.resolve("bases.csv"), "# version: 1\n" + header + "\nnah,sodium hydride,NaH,hydride,"
                + "[Na+].[H-],[H][H],Na,,,,35.3,2,own,,,,,,,,1,none,dispersion,55 % dispersion,55,mass-percent,24.00,,hydrogen,,,own\n");
        assertEquals(55, Stockroom.load(TableFolders.overlaidBy(folder)).base("NaH").strength().orElseThrow().value());
    }

    @Test
    void aNameTwoRowsShareIsRefusedNamingBoth(@TempDir Path folder) throws IOException {
        Files.writeString(folder.resolve("bases.csv"), ownTable("my-base,my base,KO-tBu,alkoxide"));
        TableException e = assertThrows(TableException.class, () -> Stockroom.load(TableFolders.overlaidBy(folder)));
        assertTrue(e.getMessage().contains("my-base") && e.getMessage().contains("kotbu"), e.getMessage());
    }

    private static String ownTable(String firstCells) {
        String header = String.join(",", BaseTable.BASES.columns().stream().map(column -> column.name()).toList());
        return "# version: 1\n" + header + "\n" + firstCells
                + ",[Na+].[O-]CC1CC1,OCC1CC1,Na,,,,31.0,0.5,own measurement,,,,,,,,1,high,solid,solid,,,94.09,,,,,own\n";
    }
}
