package lyate.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.Component;
import java.awt.Container;
import java.awt.GraphicsEnvironment;
import java.awt.event.MouseEvent;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import javax.imageio.ImageIO;
import javax.swing.AbstractButton;
import javax.swing.JComboBox;
import javax.swing.JFrame;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JScrollBar;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;
import lyate.review.Verdict;
import lyate.sheet.RouteSheet;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Drives the real window; needs a display, for example Xvfb. */
class WorkbenchTest {

    private JFrame frame;
    private Workbench bench;
    private SheetDocument document;

    @BeforeEach
    void openWindow() throws Exception {
        assumeFalse(GraphicsEnvironment.isHeadless(), "the window needs a display");
        onEventThread(() -> {
            Theme theme = new Theme(false);
            theme.install();
            document = Panels.document(StepText.demo());
            bench = new Workbench(theme, Panels.engine(), document);
            frame = new JFrame();
            frame.setContentPane(bench);
            frame.setSize(1500, 920);
            frame.setVisible(true);
            return null;
        });
        waitFor(bench -> bench.shown().isPresent());
    }

    @AfterEach
    void closeWindow() throws Exception {
        if (frame != null) {
            onEventThread(() -> {
                bench.close();
                frame.dispose();
                return null;
            });
        }
    }

    @Test
    void opensOnAStepThatShowsAConflict() throws Exception {
        assertEquals(Verdict.WRONG_SITE, onEventThread(() -> bench.shown().orElseThrow().review().verdict()));
    }

    @Test
    void typingAnotherBaseReviewsTheStepAnew() throws Exception {
        type(StepField.BASE, "LDA");
        waitFor(bench -> bench.shown().orElseThrow().review().step().base().id().equals("lda"));
    }

    @Test
    void halfATextLeavesTheLastPictureAndSaysWhatIsWrong() throws Exception {
        type(StepField.SUBSTRATE, "O=C(C1CC");
        waitFor(bench -> bench.strip().box(StepField.SUBSTRATE).line().isProblem());
        assertEquals("O=C(C1CCC1)Nc1ccc(C)c(O)c1", onEventThread(() -> bench.shown().orElseThrow().review().step().substrate().input()));
        waitFor(Workbench::isOutdated);
        type(StepField.SUBSTRATE, "CCO");
        waitFor(bench -> bench.shown().orElseThrow().review().step().substrate().input().equals("CCO"));
        assertFalse(onEventThread(bench::isOutdated));
        assertFalse(onEventThread(() -> bench.strip().box(StepField.SUBSTRATE).line().isProblem()));
    }

    @Test
    void aNewStepIsAskedForWhatIsMissingWithoutBeingScolded() throws Exception {
        type(StepField.BASE, "");
        type(StepField.SUBSTRATE, "");
        waitFor(bench -> says(bench, "Type, paste or drop a structure above"));
        assertFalse(onEventThread(() -> bench.strip().box(StepField.SUBSTRATE).line().isProblem()));
        type(StepField.SUBSTRATE, "CCO");
        waitFor(bench -> says(bench, "Now choose a base"));
        type(StepField.BASE, "NaH");
        waitFor(bench -> bench.shown().isPresent());
    }

    private static boolean says(Container parent, String words) {
        return Arrays.stream(parent.getComponents()).anyMatch(child -> child.isShowing()
                && (child instanceof JLabel label && words.equals(label.getText()) || child instanceof Container container && says(container, words)));
    }

    @Test
    void ofManyKeystrokesOnlyTheLastIsShown() throws Exception {
        String text = "CCCCCCCCO";
        for (int length = 1; length <= text.length(); length++) {
            type(StepField.SUBSTRATE, text.substring(0, length));
        }
        waitFor(bench -> bench.shown().orElseThrow().review().step().substrate().input().equals(text));
    }

    @Test
    void choosingASiteMakesItTheIntendedOne() throws Exception {
        onEventThread(() -> {
            bench.intend("O14");
            return null;
        });
        waitFor(bench -> bench.shown().orElseThrow().review().intendedSite().equals("O14"));
        assertTrue(onEventThread(() -> bench.shown().orElseThrow().intended().orElseThrow().intended()));
    }

    @Test
    void aClickOnATagMakesItsSiteTheIntendedOne() throws Exception {
        waitFor(bench -> bench.substrate().placeOf("O14").isPresent());
        onEventThread(() -> {
            Rectangle2D box = bench.substrate().placeOf("O14").orElseThrow();
            mouse(bench.substrate(), MouseEvent.MOUSE_CLICKED, (int) box.getCenterX(), (int) box.getCenterY());
            return null;
        });
        waitFor(bench -> bench.shown().orElseThrow().review().intendedSite().equals("O14"));
    }

    @Test
    void draggingTheLineOfTheDoseChangesTheEquivalents() throws Exception {
        onEventThread(() -> {
            bench.drawer().setSelectedComponent(bench.drawer().dose());
            return null;
        });
        waitFor(bench -> bench.isSettled() && bench.drawer().dose().chart().getChart() != null
                && bench.drawer().dose().chart().getScreenDataArea().getWidth() > 0);
        onEventThread(() -> {
            DosePanel dose = bench.drawer().dose();
            int middle = dose.chart().getHeight() / 2;
            mouse(dose.chart(), MouseEvent.MOUSE_PRESSED, dose.lineAt(1.05), middle);
            mouse(dose.chart(), MouseEvent.MOUSE_DRAGGED, dose.lineAt(2.0), middle);
            mouse(dose.chart(), MouseEvent.MOUSE_RELEASED, dose.lineAt(2.0), middle);
            return null;
        });
        waitFor(bench -> bench.shown().orElseThrow().review().step().equivalents() == 2.0);
        assertEquals("2", onEventThread(() -> bench.strip().box(StepField.EQUIVALENTS).text()));
    }

    @Test
    void everyPictureIsSavedAsPngSvgAndPdf(@TempDir Path folder) throws Exception {
        waitFor(bench -> bench.picture(WindowMenu.Drawn.SUBSTRATE).isPresent() && bench.picture(WindowMenu.Drawn.LADDER).isPresent());
        for (WindowMenu.Drawn what : List.of(WindowMenu.Drawn.SUBSTRATE, WindowMenu.Drawn.LADDER)) {
            saveInEveryKind(what, folder.resolve(what.name()));
        }
        for (LazyTab tab : List.of(bench.drawer().dose(), bench.drawer().workUp())) {
            onEventThread(() -> {
                bench.drawer().setSelectedComponent(tab);
                return null;
            });
            waitFor(bench -> bench.isSettled() && bench.picture(WindowMenu.Drawn.CHART).isPresent());
            saveInEveryKind(WindowMenu.Drawn.CHART, folder.resolve(tab.getAccessibleContext().getAccessibleName()));
        }
    }

    private void saveInEveryKind(WindowMenu.Drawn what, Path name) throws Exception {
        Picture picture = onEventThread(() -> bench.picture(what).orElseThrow());
        Path png = name.resolveSibling(name.getFileName() + ".png");
        Path svg = name.resolveSibling(name.getFileName() + ".svg");
        Path pdf = name.resolveSibling(name.getFileName() + ".pdf");
        onEventThread(() -> {
            Pictures.save(picture, png);
            Pictures.save(picture, svg);
            Pictures.save(picture, pdf);
            return null;
        });
        BufferedImage image = ImageIO.read(png.toFile());
        int ground = picture.ground().getRGB();
        long drawn = IntStream.range(0, image.getWidth() * image.getHeight())
                .filter(i -> image.getRGB(i % image.getWidth(), i / image.getWidth()) != ground).count();
        assertTrue(drawn > 1000, what + " is drawn on the picture");
        assertTrue(Files.readString(svg).split("<path").length > 10, what + " is drawn as paths");
        try (PDDocument document = Loader.loadPDF(pdf.toFile())) {
            assertEquals(picture.size().width, document.getPage(0).getMediaBox().getWidth(), 0.5);
        }
    }

    @Test
    void everyControlThatTakesTheKeyboardHasAName() throws Exception {
        onEventThread(() -> {
            assertEquals(List.of(), nameless(bench));
            return null;
        });
    }

    private static List<String> nameless(Container parent) {
        List<String> found = new ArrayList<>();
        for (Component child : parent.getComponents()) {
            boolean control = child instanceof JTextComponent text && text.isEditable() || child instanceof AbstractButton && child.isFocusable()
                    || child instanceof JTable || child instanceof JList || child instanceof JComboBox;
            String name = child.getAccessibleContext() == null ? "" : child.getAccessibleContext().getAccessibleName();
            if (control && child.isShowing() && (name == null || name.isBlank())) {
                found.add(child.getClass().getSimpleName() + " in " + parent.getClass().getSimpleName());
            }
            if (child instanceof Container container && !(child instanceof JComboBox) && !(child instanceof JScrollBar)) {
                found.addAll(nameless(container));
            }
        }
        return found;
    }

    private static void mouse(Component target, int kind, int x, int y) {
        target.dispatchEvent(new MouseEvent(target, kind, System.currentTimeMillis(), MouseEvent.BUTTON1_DOWN_MASK, x, y, 1, false, MouseEvent.BUTTON1));
    }

    @Test
    void undoBringsBackFieldsAndReview() throws Exception {
        type(StepField.BASE, "LDA");
        waitFor(bench -> bench.shown().orElseThrow().review().step().base().id().equals("lda"));
        onEventThread(() -> {
            document.undo();
            return null;
        });
        waitFor(bench -> bench.shown().orElseThrow().review().step().base().id().equals("nah"));
        assertEquals("NaH", onEventThread(() -> bench.strip().box(StepField.BASE).text()));
    }

    @Test
    void aSheetIsSavedAndOpenedAgain(@TempDir Path folder) throws Exception {
        Path file = folder.resolve("sheet.csv");
        onEventThread(() -> {
            document.change(document.state().duplicated());
            document.edit(document.state().text().with(StepField.SOLVENT, "THF"));
            document.state().sheet().save(file);
            document.saved(file);
            document.open(RouteSheet.read(file), Optional.of(file), Files.readString(file));
            document.select(1);
            return null;
        });
        waitFor(bench -> bench.shown().orElseThrow().review().step().solvent().id().equals("thf"));
        assertEquals("THF", onEventThread(() -> bench.strip().box(StepField.SOLVENT).text()));
    }

    @Test
    void anEmptyNumberMeansTheUsualOne() throws Exception {
        type(StepField.TEMPERATURE, "");
        waitFor(bench -> bench.shown().orElseThrow().review().step().temperatureCelsius() == 25);
    }

    @Test
    void theRoomIsSharedAsItWasLastTime() throws Exception {
        onEventThread(() -> {
            bench.arrange("0.500 0.300 0.600 2");
            bench.revalidate();
            frame.validate();
            return null;
        });
        waitFor(bench -> bench.drawer().getSelectedComponent() == bench.drawer().dose());
        String[] now = onEventThread(bench::arrangement).split(" ");
        double[] wanted = {0.5, 0.3, 0.6, 2};
        for (int i = 0; i < wanted.length; i++) {
            assertEquals(wanted[i], Double.parseDouble(now[i]), 0.01);
        }
        onEventThread(() -> {
            bench.arrange("0.9 nonsense");
            return null;
        });
        assertEquals(String.join(" ", now), onEventThread(bench::arrangement));
    }

    private void type(StepField field, String text) throws Exception {
        onEventThread(() -> {
            bench.strip().box(field).field().setText(text);
            return null;
        });
    }

    private void waitFor(Predicate<Workbench> condition) throws Exception {
        long end = System.nanoTime() + 10_000_000_000L;
        while (!onEventThread(() -> condition.test(bench))) {
            assertTrue(System.nanoTime() < end, "the window did not get there in 10 s");
            Thread.sleep(10);
        }
    }

    private static <T> T onEventThread(Callable<T> task) throws Exception {
        FutureTask<T> future = new FutureTask<>(task);
        SwingUtilities.invokeAndWait(future);
        return future.get();
    }
}
