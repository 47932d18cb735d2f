package lyate.window;

import java.awt.Toolkit;
import java.awt.datatransfer.StringSelection;
import java.io.File;
import java.io.IOException;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JOptionPane;

/** What the menu does. */
final class WindowCommands implements WindowMenu.Commands {

    private final JFrame frame;
    private final Workbench bench;
    private final Theme theme;
    private final WindowMemory memory;

    WindowCommands(JFrame frame, Workbench bench, Theme theme, WindowMemory memory) {
        this.frame = frame;
        this.bench = bench;
        this.theme = theme;
        this.memory = memory;
    }

    @Override
    public void newStep() {
        bench.open(bench.strip().text().with(StepField.SUBSTRATE, "").withSite(""));
        bench.strip().box(StepField.SUBSTRATE).field().requestFocusInWindow();
    }

    @Override
    public void openDemo() {
        bench.open(StepText.demo());
    }

    @Override
    public void copyPicture() {
        bench.shown().ifPresent(shown -> Toolkit.getDefaultToolkit().getSystemClipboard().setContents(
                new ImageSelection(Pictures.image(shown, theme.palette(), bench.substrate().getSize())), null));
    }

    @Override
    public void savePicture() {
        bench.shown().ifPresent(shown -> {
            JFileChooser chooser = new JFileChooser();
            chooser.setSelectedFile(new File("substrate.svg"));
            if (chooser.showSaveDialog(frame) == JFileChooser.APPROVE_OPTION) {
                try {
                    Pictures.save(shown, theme.palette(), bench.substrate().getSize(), chooser.getSelectedFile().toPath());
                } catch (IOException e) {
                    JOptionPane.showMessageDialog(frame, "The picture was not saved: " + e.getMessage(), "Lyate", JOptionPane.ERROR_MESSAGE);
                }
            }
        });
    }

    @Override
    public void copySmiles() {
        bench.shown().ifPresent(shown -> Toolkit.getDefaultToolkit().getSystemClipboard().setContents(
                new StringSelection(shown.review().step().substrate().input()), null));
    }

    @Override
    public void fit() {
        bench.substrate().fit();
    }

    @Override
    public void setDark(boolean dark) {
        theme.switchTo(dark);
        memory.put("dark", Boolean.toString(dark));
    }

    @Override
    public void zoomed(float zoom) {
        memory.put("zoom", Float.toString(zoom));
    }

    @Override
    public void about() {
        PageWindow.open(frame, "About Lyate", "about.html", theme);
    }

    @Override
    public void guide() {
        PageWindow.open(frame, "Guide", "guide.html", theme);
    }

    @Override
    public void quit() {
        frame.dispose();
    }
}
