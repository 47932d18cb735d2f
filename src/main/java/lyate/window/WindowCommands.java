package lyate.window;

import java.awt.Toolkit;
import java.awt.datatransfer.StringSelection;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JOptionPane;
import javax.swing.filechooser.FileNameExtensionFilter;
import lyate.molecule.MoleculeText;

/** What the menu does. */
final class WindowCommands implements WindowMenu.Commands {

    private final JFrame frame;
    private final Workbench bench;
    private final SheetDocument document;
    private final SheetFiles files;
    private final Theme theme;
    private final LookKeeper looks;
    private final WindowMemory memory;

    WindowCommands(JFrame frame, Workbench bench, SheetDocument document, SheetFiles files, Theme theme, LookKeeper looks, WindowMemory memory) {
        this.frame = frame;
        this.bench = bench;
        this.document = document;
        this.files = files;
        this.theme = theme;
        this.looks = looks;
        this.memory = memory;
    }

    @Override
    public void newSheet() {
        files.startNew();
        bench.strip().box(StepField.SUBSTRATE).field().requestFocusInWindow();
    }

    @Override
    public void openDemo() {
        files.openDemo();
    }

    @Override
    public void open() {
        files.open();
    }

    @Override
    public void open(Path file) {
        files.open(file);
    }

    @Override
    public List<Path> recent() {
        return memory.recent();
    }

    @Override
    public void save() {
        files.save();
    }

    @Override
    public void saveAs() {
        files.saveAs();
    }

    @Override
    public void undo() {
        document.undo();
    }

    @Override
    public void redo() {
        document.redo();
    }

    @Override
    public void addStep() {
        document.add();
        bench.strip().box(StepField.SUBSTRATE).field().requestFocusInWindow();
    }

    @Override
    public void duplicateStep() {
        document.change(document.state().duplicated());
    }

    @Override
    public void deleteStep() {
        document.change(document.state().removed());
    }

    @Override
    public void moveStep(int by) {
        document.change(document.state().moved(by));
    }

    @Override
    public void goToStep(int by) {
        document.select(document.state().selected() + by);
    }

    @Override
    public void copyPicture(WindowMenu.Drawn what) {
        bench.picture(what).ifPresentOrElse(picture -> Toolkit.getDefaultToolkit().getSystemClipboard().setContents(
                new ImageSelection(Pictures.image(picture)), null), Toolkit.getDefaultToolkit()::beep);
    }

    @Override
    public void savePicture(WindowMenu.Drawn what) {
        bench.picture(what).ifPresentOrElse(this::save, Toolkit.getDefaultToolkit()::beep);
    }

    private void save(Picture picture) {
        JFileChooser chooser = new JFileChooser();
        chooser.setFileFilter(new FileNameExtensionFilter("Pictures (*.svg, *.pdf, *.png)", "svg", "pdf", "png"));
        chooser.setSelectedFile(new File(picture.name() + ".svg"));
        if (chooser.showSaveDialog(frame) == JFileChooser.APPROVE_OPTION) {
            try {
                Pictures.save(picture, chooser.getSelectedFile().toPath());
            } catch (IOException e) {
                JOptionPane.showMessageDialog(frame, "The picture was not saved: " + e.getMessage(), "Lyate", JOptionPane.ERROR_MESSAGE);
            }
        }
    }

    @Override
    public void copySmiles() {
        bench.shown().ifPresent(shown -> copy(MoleculeText.smiles(shown.review().step().substrate())));
    }

    @Override
    public void copyMolfile() {
        bench.shown().ifPresent(shown -> copy(MoleculeText.molfile(shown.review().step().substrate())));
    }

    private static void copy(String text) {
        Toolkit.getDefaultToolkit().getSystemClipboard().setContents(new StringSelection(text), null);
    }

    @Override
    public void fit() {
        bench.substrate().fit();
    }

    @Override
    public Look look() {
        return memory.look();
    }

    @Override
    public void choose(Look look) {
        looks.choose(look);
    }

    @Override
    public void zoomed(float zoom) {
        memory.put("zoom", Float.toString(zoom));
    }

    @Override
    public void preferences() {
        new PreferencesWindow(frame, theme, looks, memory).setVisible(true);
    }

    @Override
    public void guide() {
        PageWindow.open(frame, "Guide", "guide.html", theme);
    }

    @Override
    public void about() {
        PageWindow.open(frame, "About Lyate", "about.html", theme);
    }

    @Override
    public void quit() {
        if (files.mayLeave()) {
            frame.dispose();
        }
    }
}
