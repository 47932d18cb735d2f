package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.Frame;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.JFrame;
import javax.swing.JOptionPane;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.SwingUtilities;
import javax.swing.ToolTipManager;
import lyate.table.TableFolders;

/** The window of the program. For the event thread. */
public final class WorkbenchFrame extends JFrame {

    private final transient WindowMemory memory;
    private final transient Theme theme;
    private final transient LookKeeper looks;
    private transient Workbench bench;
    private transient SheetFiles files;
    private transient Recovery recovery;

    private WorkbenchFrame(WindowMemory memory) {
        super("Lyate");
        this.memory = memory;
        this.theme = new Theme(memory.isDark());
        this.looks = new LookKeeper(theme, memory, () -> SystemLook.ofDesktop().isDark());
        theme.install();
        UIScale.setZoomFactor(memory.zoom());
        // Long enough to read how an estimate adds up.
        ToolTipManager.sharedInstance().setDismissDelay(60_000);
        setIconImages(AppIcon.images());
        setDefaultCloseOperation(DO_NOTHING_ON_CLOSE);
        addWindowListener(new WindowAdapter() {
            @Override
            public void windowClosing(WindowEvent event) {
                if (files == null || files.mayLeave()) {
                    dispose();
                }
            }

            @Override
            public void windowActivated(WindowEvent event) {
                looks.follow();
            }

            @Override
            public void windowClosed(WindowEvent event) {
                leave();
            }
        });
        place();
    }

    /** Opens the window of the program with the tables in these folders; may be called on any thread. */
    public static void open(TableFolders folders) {
        WindowMemory memory = WindowMemory.ofUser();
        open(Engine.load(memory.tables(folders)), memory);
    }

    /** Shows the window, whether or not the engine is there yet. */
    static void open(Engine engine, WindowMemory memory) {
        SwingUtilities.invokeLater(() -> {
            WorkbenchFrame frame = new WorkbenchFrame(memory);
            frame.fill(engine);
            frame.setVisible(true);
            engine.onFailure(frame::withoutOwnTables);
        });
    }

    /** Tables that cannot be read must not lock the user out: the program goes on with its own. */
    private void withoutOwnTables(String problem) {
        JTextArea text = new JTextArea(problem, 16, 90);
        text.setEditable(false);
        JOptionPane.showMessageDialog(this, new JScrollPane(text), "The tables could not be read; going on with the program's own",
                JOptionPane.ERROR_MESSAGE);
        bench.close();
        recovery.close();
        fill(Engine.load(TableFolders.packaged()));
    }

    private void fill(Engine engine) {
        getContentPane().removeAll();
        SheetDocument document = new SheetDocument(StepCells.sheetOf(StepText.demo()), System::nanoTime, memory::newStep);
        files = new SheetFiles(this, document, memory);
        bench = new Workbench(theme, engine, document);
        bench.arrange(memory.get("arrangement", ""));
        recovery = new Recovery(memory.recoveryFolder(), document);
        setJMenuBar(new WindowMenu(new WindowCommands(this, bench, document, files, theme, looks, memory), theme));
        document.onChange(() -> setTitle(title(document)));
        setTitle(title(document));
        add(bench, BorderLayout.CENTER);
        offerRecovery(document);
        revalidate();
        repaint();
    }

    /** Whether a review is on screen. */
    boolean reviewed() {
        return bench != null && bench.shown().isPresent();
    }

    /** What opens and saves its sheet. */
    SheetFiles files() {
        return files;
    }

    Theme theme() {
        return theme;
    }

    /** What the window shows. */
    Workbench bench() {
        return bench;
    }

    private static String title(SheetDocument document) {
        String name = document.file().map(file -> file.getFileName().toString()).orElse("new sheet");
        return (document.isModified() ? "*" : "") + name + " \u2013 Lyate";
    }

    /** Asks about sheets that a crash left unsaved. */
    private void offerRecovery(SheetDocument document) {
        for (Path left : Recovery.leftBehind(memory.recoveryFolder(), Recovery::isRunning)) {
            SwingUtilities.invokeLater(() -> {
                int answer = JOptionPane.showConfirmDialog(this, "Lyate ended unexpectedly. Open the unsaved sheet it left?", "Lyate",
                        JOptionPane.YES_NO_OPTION);
                if (answer == JOptionPane.YES_OPTION && files.mayLeave()) {
                    Recovery.take(left).ifPresent(sheet -> document.open(sheet, Optional.empty(), ""));
                }
            });
        }
    }

    private void place() {
        setMinimumSize(new Dimension(theme.space("window.width") / 2, theme.space("window.height") / 2));
        memory.bounds().ifPresentOrElse(this::setBounds, () -> {
            Rectangle room = GraphicsEnvironment.getLocalGraphicsEnvironment().getMaximumWindowBounds();
            setSize(Math.min(theme.space("window.width"), room.width), Math.min(theme.space("window.height"), room.height));
            setLocationRelativeTo(null);
        });
        if (Boolean.parseBoolean(memory.get("maximised", "false"))) {
            setExtendedState(Frame.MAXIMIZED_BOTH);
        }
    }

    @Override
    public void dispose() {
        memory.remember(this);
        if (bench != null) {
            memory.put("arrangement", bench.arrangement());
        }
        super.dispose();
    }

    private void leave() {
        if (bench != null) {
            bench.close();
            recovery.close();
        }
        memory.save();
    }
}
