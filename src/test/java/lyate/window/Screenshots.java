package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import java.awt.Dimension;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import javax.imageio.ImageIO;
import javax.swing.JFrame;
import javax.swing.SwingUtilities;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/** Writes pictures of the window in its states; needs a display. Argument: the folder to write to. */
final class Screenshots {

    private final Path folder;
    private final Engine engine = Engine.load(TableFolders.packaged());
    private final Stockroom stockroom = engine.stockroom();

    private Screenshots(Path folder) {
        this.folder = folder;
    }

    public static void main(String[] arguments) throws Exception {
        Screenshots screenshots = new Screenshots(Files.createDirectories(Path.of(arguments[0])));
        int status = 1;
        try {
            screenshots.takeAll(StepText.demo());
            status = 0;
        } catch (IllegalStateException e) {
            System.err.println(e.getMessage());
        }
        System.exit(status);
    }

    private void takeAll(StepText demo) throws Exception {
        take("light", false, 1, 1500, 920, demo);
        take("dose", true, 1, 1500, 920, demo, bench -> bench.drawer().setSelectedIndex(2));
        take("choice", false, 1, 1500, 920, demo.withSite("O14"), bench -> bench.drawer().setSelectedIndex(1));
        take("amounts", false, 1, 1500, 920, demo, bench -> bench.drawer().setSelectedIndex(3));
        take("error", false, 1, 1200, 760, demo, bench -> {
            bench.strip().box(StepField.SUBSTRATE).field().setText("O=C(C1CCC1)Nc1ccc(C)c(O)c");
            bench.strip().box(StepField.BASE).field().setText("LiHDMS");
            bench.strip().box(StepField.CONCENTRATION).field().setText("much");
        });
        take("compare", false, 1, 1500, 920, demo, bench -> List.of("lda", "kotbu", "dbu").forEach(id ->
                bench.ladder().compare(stockroom.bases().stream().filter(base -> base.id().equals(id)).findFirst().orElseThrow())));
        take("sheet", false, 1, 1500, 920, demo, Screenshots::fortySteps);
        take("dark", true, 1, 1500, 920, demo);
        take("empty", false, 1, 1500, 920, demo.with(StepField.SUBSTRATE, "").withSite(""));
        take("double", false, 2, 2400, 1500, demo);
        take("workup", false, 1, 1500, 920, demo.with(StepField.BASE, "Et3N").with(StepField.SOLVENT, "dichloromethane").with(StepField.SUBSTRATE, "OC(=O)c1ccccc1CNC(=O)C").withSite(""), bench -> bench.drawer().setSelectedIndex(4));
        String big = "CC(C)CC(NC(=O)C(CC(N)=O)NC(=O)C(Cc1ccc(O)cc1)NC(=O)C(C)N)C(=O)NC(CO)C(=O)NC(Cc1c[nH]cn1)C(=O)NC(CS)C(=O)NCC(=O)O";
        take("sixty", false, 1, 1500, 920, demo.with(StepField.SUBSTRATE, big).withSite(""));
        take("low", false, 1, 1300, 640, demo.with(StepField.SUBSTRATE, "OCC1OC(O)C(O)C(O)C1NC(=O)CC(=O)c1ccc[nH]1").withSite(""));
        take("long", false, 1, 1300, 800, demo.with(StepField.SUBSTRATE, "ethyl 2-(4-hydroxy-3-methoxyphenyl)-3-oxobutanoate")
                .with(StepField.BASE, "lithium bis(trimethylsilyl)amide").with(StepField.SOLVENT, "cyclopentyl methyl ether").withSite(""));
    }

    /** Four substrates with ten bases each. */
    private static void fortySteps(Workbench bench) {
        List<String> bases = List.of("NaH", "LDA", "K2CO3", "DBU", "n-BuLi", "KOtBu", "Et3N", "LiHMDS", "NaOEt", "MeMgBr");
        List<String> substrates = List.of("O=C(C1CCC1)Nc1ccc(C)c(O)c1", "CCOC(=O)CC(=O)CCO", "C#CCCC(C)=O", "c1ccc2[nH]ccc2c1");
        SheetDocument document = bench.document();
        for (int i = 1; i < substrates.size() * bases.size(); i++) {
            document.change(document.state().duplicated());
            String substrate = substrates.get(i / bases.size());
            document.edit(document.state().text().with(StepField.SUBSTRATE, substrate).with(StepField.BASE, bases.get(i % bases.size()))
                    .withSite(i < bases.size() ? "N7" : ""));
        }
        document.select(12);
    }

    private void take(String name, boolean dark, float zoom, int width, int height, StepText step) throws Exception {
        take(name, dark, zoom, width, height, step, bench -> {});
    }

    private void take(String name, boolean dark, float zoom, int width, int height, StepText step, Consumer<Workbench> action) throws Exception {
        AtomicReference<JFrame> frame = new AtomicReference<>();
        AtomicReference<Workbench> bench = new AtomicReference<>();
        SwingUtilities.invokeAndWait(() -> {
            Theme theme = new Theme(dark);
            theme.install();
            UIScale.setZoomFactor(zoom);
            bench.set(new Workbench(theme, engine, Panels.document(step)));
            frame.set(new JFrame(name));
            frame.get().setContentPane(bench.get());
            frame.get().setSize(new Dimension(width, height));
            frame.get().setVisible(true);
        });
        settle(bench.get());
        SwingUtilities.invokeAndWait(() -> action.accept(bench.get()));
        settle(bench.get());
        SwingUtilities.invokeAndWait(() -> write(name, frame.get()));
        SwingUtilities.invokeAndWait(() -> {
            bench.get().close();
            frame.get().dispose();
        });
    }

    /** Waits until the window says what it has to say, and a little for what is drawn later. */
    private static void settle(Workbench bench) throws Exception {
        AtomicReference<Boolean> settled = new AtomicReference<>(false);
        long end = System.nanoTime() + 120_000_000_000L;
        while (!settled.get()) {
            if (System.nanoTime() > end) {
                throw new IllegalStateException("the window did not settle within two minutes");
            }
            Thread.sleep(200);
            SwingUtilities.invokeAndWait(() -> settled.set(bench.isSettled()));
        }
        Thread.sleep(200);
    }

    private void write(String name, JFrame frame) {
        BufferedImage image = new BufferedImage(frame.getContentPane().getWidth(), frame.getContentPane().getHeight(), BufferedImage.TYPE_INT_RGB);
        frame.getContentPane().paint(image.createGraphics());
        try {
            ImageIO.write(image, "png", folder.resolve(name + ".png").toFile());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
