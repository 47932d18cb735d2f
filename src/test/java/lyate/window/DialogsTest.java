package lyate.window;

import static lyate.window.Driver.answer;
import static lyate.window.Driver.inDialog;
import static lyate.window.Driver.later;
import static lyate.window.Driver.onEventThread;
import static lyate.window.Driver.waitFor;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.GraphicsEnvironment;
import java.awt.Window;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import javax.swing.JComboBox;
import javax.swing.JFileChooser;
import javax.swing.TransferHandler.TransferSupport;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The questions the program asks, in its real window; needs a display, for example Xvfb. */
class DialogsTest {

    @TempDir
    private Path folder;

    private WindowMemory memory;
    private WorkbenchFrame frame;

    @BeforeEach
    void needsADisplay() {
        assumeFalse(GraphicsEnvironment.isHeadless(), "the window needs a display");
        memory = new WindowMemory(folder.resolve("window.properties"));
        memory.setLook(Look.LIGHT);
    }

    @AfterEach
    void close() throws Exception {
        if (frame != null) {
            onEventThread(() -> {
                Arrays.stream(Window.getWindows()).filter(window -> window != frame).forEach(Window::dispose);
                frame.dispose();
                return null;
            });
            // What the window writes when it is told that it was closed is written before the folder goes.
            onEventThread(() -> null);
        }
    }

    @Test
    void aSheetIsOpenedWithTheFileDialogAndSavedUnderAnotherName() throws Exception {
        Path first = Files.writeString(folder.resolve("first.csv"), "step,substrate,base,solvent,notes\nA,CCO,NaH,THF,kept\nB,CC(C)=O,LDA,THF,\n");
        Path second = folder.resolve("second.csv");
        open();
        later(() -> frame.files().open());
        choose(first);
        waitFor("the sheet", () -> document().state().sheet().rows().size() == 2);
        assertEquals(Optional.of(first), onEventThread(() -> document().file()));
        onEventThread(() -> {
            document().edit(document().state().text().with(StepField.BASE, "KH"));
            return null;
        });
        later(() -> frame.files().saveAs());
        choose(folder.resolve("second"));
        waitFor("the file", () -> Files.exists(second) && !document().isModified());
        assertTrue(Files.readString(second).contains("A,CCO,KH,THF,kept"));
        assertTrue(Files.readString(first).contains("A,CCO,NaH,THF,kept"));
        assertEquals(List.of(second, first), onEventThread(memory::recent));
    }

    @Test
    void anExistingFileIsReplacedOnlyAfterAQuestion() throws Exception {
        Path there = Files.writeString(folder.resolve("there.csv"), "precious");
        open();
        later(() -> frame.files().saveAs());
        choose(there);
        answer("Cancel");
        waitFor("the end of the question", () -> Arrays.stream(Window.getWindows()).noneMatch(window -> window != frame && window.isShowing()));
        assertEquals("precious", Files.readString(there));
    }

    @Test
    void unsavedChangesAreNotLeftWithoutAQuestion() throws Exception {
        open();
        onEventThread(() -> {
            document().edit(document().state().text().with(StepField.BASE, "KH"));
            return null;
        });
        boolean[] left = {true};
        later(() -> left[0] = frame.files().mayLeave());
        answer("Cancel");
        waitFor("the answer", () -> !left[0]);
        later(() -> left[0] = frame.files().mayLeave());
        answer("Do not save");
        waitFor("the answer", () -> left[0]);
    }

    @Test
    void aSheetThatACrashLeftIsOfferedAndOpened() throws Exception {
        Path copies = Files.createDirectories(memory.recoveryFolder());
        // No system gives a process so high a number.
        Path copy = copies.resolve("unsaved-4000000001.csv");
        StepText lost = StepText.demo().with(StepField.SOLVENT, "CPME");
        StepCells.sheetOf(lost).save(copy);
        open();
        answer("Yes");
        waitFor("the sheet", () -> document().state().text().get(StepField.SOLVENT).equals("CPME"));
        assertTrue(onEventThread(() -> document().isModified()), "what was recovered is not saved yet");
        assertFalse(Files.exists(copy));
    }

    @Test
    void aFileThatIsNoSheetIsRefusedInWords() throws Exception {
        Path photo = Files.write(folder.resolve("photo.csv"), new byte[] {(byte) 0xff, (byte) 0xd8, 0});
        open();
        StepText before = onEventThread(() -> document().state().text());
        later(() -> frame.files().open(photo));
        answer("OK");
        assertEquals(before, onEventThread(() -> document().state().text()));
    }

    @Test
    void everyStructureOfADroppedFileBecomesAStep() throws Exception {
        Path file = Files.writeString(folder.resolve("three.smi"), "CCO ethanol\nCC(C)=O acetone\nc1ccccc1O phenol\n");
        open();
        onEventThread(() -> frame.bench().getTransferHandler().importData(new TransferSupport(frame.bench(), filesOf(file))));
        List<String> substrates = onEventThread(() -> document().state().sheet().rows().stream().map(row -> StepCells.text(row).get(StepField.SUBSTRATE)).toList());
        assertEquals(List.of("CCO", "CC(C)=O", "c1ccccc1O"), substrates);
        waitFor("the first of them", () -> frame.bench().shown().orElseThrow().review().step().substrate().input().equals("CCO"));
        onEventThread(() -> {
            document().undo();
            return null;
        });
        assertEquals(1, onEventThread(() -> document().state().sheet().rows().size()));
    }

    @Test
    void thePreferencesAreKept() throws Exception {
        open();
        later(() -> new PreferencesWindow(frame, frame.theme(), new LookKeeper(frame.theme(), memory, Optional::empty), memory).setVisible(true));
        JComboBox<?> look = inDialog(JComboBox.class);
        onEventThread(() -> {
            look.setSelectedItem(Look.DARK);
            return null;
        });
        answer("Keep");
        waitFor("the dark", () -> frame.theme().palette().dark());
        assertEquals(Look.DARK, new WindowMemory(folder.resolve("window.properties")).look());
        onEventThread(() -> {
            frame.theme().switchTo(false);
            return null;
        });
    }

    private static Transferable filesOf(Path file) {
        return new Transferable() {
            @Override
            public DataFlavor[] getTransferDataFlavors() {
                return new DataFlavor[] {DataFlavor.javaFileListFlavor};
            }

            @Override
            public boolean isDataFlavorSupported(DataFlavor flavor) {
                return flavor.equals(DataFlavor.javaFileListFlavor);
            }

            @Override
            public Object getTransferData(DataFlavor flavor) {
                return List.of(file.toFile());
            }
        };
    }

    private void choose(Path file) throws Exception {
        JFileChooser chooser = inDialog(JFileChooser.class);
        onEventThread(() -> {
            chooser.setSelectedFile(file.toFile());
            chooser.approveSelection();
            return null;
        });
    }

    private SheetDocument document() {
        return frame.bench().document();
    }

    private void open() throws Exception {
        WorkbenchFrame.open(Panels.engine(), memory);
        waitFor("the window", () -> {
            frame = Arrays.stream(Window.getWindows()).filter(WorkbenchFrame.class::isInstance).map(WorkbenchFrame.class::cast)
                    .filter(window -> window.isShowing() && window.reviewed()).findFirst().orElse(null);
            return frame != null;
        });
    }
}
