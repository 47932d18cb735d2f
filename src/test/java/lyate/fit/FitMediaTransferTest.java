package lyate.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import lyate.acidity.Acidity;
import lyate.acidity.MediaTransfer;
import lyate.stock.Medium;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FitMediaTransferTest {

    private static String fit(Path folder, PrintStream log) throws IOException {
        return FitMediaTransfer.fit(TableFolders.packaged(), folder, log);
    }

    @Test
    void makesATableTheProgramReadsAndTheSameOneEveryTime(@TempDir Path folder) throws IOException {
        Files.createDirectories(folder.resolve("training"));
        Files.writeString(folder.resolve("training/mine.csv"), """
                smiles,site,role,solvent,pka
                CCCCCCCCCC(=O)O,O12,acid,water,4.9
                CCCCCCCCCC(=O)O,O12,acid,acetonitrile,23.9
                CCO,O9,acid,water,16
                """);
        ByteArrayOutputStream log = new ByteArrayOutputStream();
        String first = fit(folder.resolve("training"), new PrintStream(log, true, StandardCharsets.UTF_8));
        assertEquals(first, fit(folder.resolve("training"), new PrintStream(ByteArrayOutputStream.nullOutputStream())));
        assertTrue(log.toString(StandardCharsets.UTF_8).contains("mine.csv:4: no atom O9"), log::toString);

        Files.createDirectories(folder.resolve("tables"));
        Files.writeString(folder.resolve("tables/media-transfer.csv"), first);
        MediaTransfer transfer = MediaTransfer.load(TableFolders.overlaidBy(folder.resolve("tables")));
        Acidity carried = transfer.carry(Acidity.measured(4.76, 0.05, Medium.WATER, "CRC Handbook (from memory)"),
                "carboxylic-acid", Medium.DMSO).orElseThrow();
        assertEquals(12.3, carried.pKa(), 1.5, "acetic acid, Bordwell 1988 (from memory)");
    }
}
