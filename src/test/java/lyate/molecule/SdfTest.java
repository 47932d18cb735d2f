package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.Reader;
import java.io.StringReader;
import java.util.List;
import org.junit.jupiter.api.Test;

/** An SD file is read record by record; a bad record spoils none of the others. */
class SdfTest {

    private final MoleculeReader reader = new MoleculeReader();

    @Test
    void everyRecordIsAMoleculeOrAReason() {
        List<SdfRecord> records = reader.readSdf(new StringReader(MoleculeReaderTest.resource("four-records.sdf"))).toList();
        assertEquals(List.of("ethanol", "broken", "no molfile at all", "acetone"), records.stream().map(SdfRecord::name).toList());
        assertEquals(List.of(1, 2, 3, 4), records.stream().map(SdfRecord::number).toList());
        assertEquals("C2H6O", records.get(0).molecule().orElseThrow().formula());
        assertEquals("line 9 of the molfile: found '  2  7  1  0',"
                + " expected bond 2 of 2: two atom numbers from 1 to 3 and a bond type", records.get(1).problem());
        assertEquals("not a molfile: line 4 states neither V2000 nor V3000", records.get(2).problem());
        assertEquals("C3H6O", records.get(3).molecule().orElseThrow().formula());
    }

    @Test
    void lastRecordNeedsNoDelimiter() {
        String text = MoleculeReaderTest.resource("four-records.sdf");
        String open = text.substring(0, text.lastIndexOf("$$$$"));
        assertEquals(4, reader.readSdf(new StringReader(open)).filter(record -> record.number() > 0).count());
    }

    @Test
    void recordsAreReadAsTheyAreAskedFor() {
        Endless endless = new Endless(MoleculeReaderTest.resource("four-records.sdf"));
        assertEquals(1000, reader.readSdf(endless).limit(1000).filter(record -> record.name().length() > 0).count());
    }

    @Test
    void oversizedRecordIsRefusedAndTheNextIsRead() {
        String huge = "huge\n" + ("x".repeat(1000) + "\n").repeat(2_100) + "$$$$\n" + MoleculeReaderTest.resource("four-records.sdf");
        List<SdfRecord> records = reader.readSdf(new StringReader(huge)).toList();
        assertEquals("the record has more than 2000000 characters", records.get(0).problem());
        assertEquals("C2H6O", records.get(1).molecule().orElseThrow().formula());
    }

    /** The same text over and over. */
    private static final class Endless extends Reader {
        private final String text;
        private int position;

        Endless(String text) {
            this.text = text;
        }

        @Override
        public int read(char[] buffer, int offset, int length) throws IOException {
            for (int i = 0; i < length; i++) {
                buffer[offset + i] = text.charAt(position++ % text.length());
            }
            return length;
        }

        @Override
        public void close() {}
    }
}
