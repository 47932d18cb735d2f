package lyate.window;

import java.awt.Component;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetException;

/** Opens and saves route sheets, asking where something would be lost. */
final class SheetFiles {

    private static final String CSV = ".csv";

    private final Component owner;
    private final SheetDocument document;
    private final WindowMemory memory;

    SheetFiles(Component owner, SheetDocument document, WindowMemory memory) {
        this.owner = owner;
        this.document = document;
        this.memory = memory;
    }

    /** A sheet with one blank step. */
    void startNew() {
        if (mayLeave()) {
            RouteSheet sheet = StepCells.sheetOf(memory.newStep());
            document.open(sheet, Optional.empty(), sheet.text());
        }
    }

    /** The invented example. */
    void openDemo() {
        if (mayLeave()) {
            RouteSheet sheet = StepCells.sheetOf(StepText.demo());
            document.open(sheet, Optional.empty(), sheet.text());
        }
    }

    void open() {
        if (mayLeave()) {
            JFileChooser chooser = chooser();
            if (chooser.showOpenDialog(owner) == JFileChooser.APPROVE_OPTION) {
                read(chooser.getSelectedFile().toPath());
            }
        }
    }

    /** Opens a file without a dialog, after asking for leave. */
    void open(Path file) {
        if (mayLeave()) {
            read(file);
        }
    }

    private void read(Path file) {
        try {
            RouteSheet sheet = RouteSheet.read(file);
            if (sheet.rows().isEmpty()) {
                tell("The sheet has a header but no row: " + file);
                return;
            }
            document.open(sheet, Optional.of(file), sheet.text());
            memory.used(file);
        } catch (IOException e) {
            tell("The sheet could not be read: " + e.getMessage());
        } catch (SheetException e) {
            tell(e.getMessage());
        }
    }

    /** Saves where the sheet came from, or asks; returns whether it is saved. */
    boolean save() {
        return document.file().map(this::write).orElseGet(this::saveAs);
    }

    boolean saveAs() {
        JFileChooser chooser = chooser();
        chooser.setSelectedFile(document.file().map(Path::toFile).orElse(new File("steps" + CSV)));
        if (chooser.showSaveDialog(owner) != JFileChooser.APPROVE_OPTION) {
            return false;
        }
        Path chosen = chooser.getSelectedFile().toPath();
        Path file = chosen.getFileName().toString().contains(".") ? chosen : chosen.resolveSibling(chosen.getFileName() + CSV);
        boolean other = !document.file().equals(Optional.of(file));
        if (other && Files.exists(file) && !agreed(file.getFileName() + " exists. Replace it?")) {
            return false;
        }
        return write(file);
    }

    private boolean write(Path file) {
        try {
            boolean same = document.file().equals(Optional.of(file));
            if (same && document.changedOnDisk() && !agreed(file.getFileName() + " was changed by another program since it was read. Replace it by yours?")) {
                return false;
            }
            document.state().sheet().save(file);
            document.saved(file);
            memory.used(file);
            return true;
        } catch (IOException e) {
            tell("The sheet was not saved: " + e.getMessage());
            return false;
        }
    }

    /** Whether the present sheet may be left: it is saved, or the user lets it go. */
    boolean mayLeave() {
        if (!document.isModified()) {
            return true;
        }
        String name = document.file().map(path -> path.getFileName().toString()).orElse("the sheet");
        Object[] choices = {"Save", "Do not save", "Cancel"};
        int answer = JOptionPane.showOptionDialog(owner, "Save the changes to " + name + "?", "Lyate", JOptionPane.DEFAULT_OPTION,
                JOptionPane.QUESTION_MESSAGE, null, choices, choices[0]);
        return answer == 0 ? save() : answer == 1;
    }

    private JFileChooser chooser() {
        JFileChooser chooser = new JFileChooser(document.file().map(path -> path.toAbsolutePath().getParent().toFile())
                .orElseGet(() -> memory.recent().stream().findFirst().map(path -> path.toAbsolutePath().getParent().toFile()).orElse(null)));
        chooser.setFileFilter(new FileNameExtensionFilter("Route sheets (*.csv)", "csv"));
        return chooser;
    }

    private boolean agreed(String question) {
        return JOptionPane.showConfirmDialog(owner, question, "Lyate", JOptionPane.OK_CANCEL_OPTION) == JOptionPane.OK_OPTION;
    }

    private void tell(String words) {
        JOptionPane.showMessageDialog(owner, words, "Lyate", JOptionPane.ERROR_MESSAGE);
    }
}
