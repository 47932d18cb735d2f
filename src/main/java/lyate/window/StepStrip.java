package lyate.window;

import java.awt.GridBagConstraints;
import java.awt.GridBagLayout;
import java.awt.Insets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import lyate.molecule.Molecule;
import lyate.review.Step;
import lyate.sheet.StepReader;
import lyate.sheet.UsualWater;

/** The row of fields at the top; tells its listener the step as typed after every edit. */
final class StepStrip extends JPanel {

    private static final int HITS = 40;

    private final Map<StepField, FieldBox> boxes = new EnumMap<>(StepField.class);
    private final Map<StepField, Suggestions> suggestions = new EnumMap<>(StepField.class);
    private final Consumer<StepText> onEdit;
    private final HintRow hints;
    private StepText text;

    StepStrip(Theme theme, Engine engine, StepText first, Consumer<StepText> onEdit, Consumer<Path> onFile) {
        super(new GridBagLayout());
        this.onEdit = onEdit;
        this.text = first;
        for (StepField field : StepField.values()) {
            int width = theme.space(field == StepField.SUBSTRATE ? "strip.substrate" : field.isNumber() ? "strip.number" : "strip.name");
            boxes.put(field, new FieldBox(field, theme, width, this::edited));
        }
        boxes.get(StepField.SUBSTRATE).field().setTransferHandler(new StructureDrop(onFile));
        suggestions.put(StepField.BASE, new Suggestions(boxes.get(StepField.BASE).field(), theme,
                typed -> engine.searchBases(typed, HITS).stream().map(StockWords::hit).toList(), () -> {}));
        suggestions.put(StepField.SOLVENT, new Suggestions(boxes.get(StepField.SOLVENT).field(), theme,
                typed -> engine.searchSolvents(typed, HITS).stream().map(StockWords::hit).toList(), () -> {}));
        int margin = theme.space("wide");
        setBorder(BorderFactory.createEmptyBorder(theme.space("gap"), margin, theme.space("small"), margin));
        for (StepField field : StepField.values()) {
            boolean last = field == StepField.PARTNER;
            double weight = field == StepField.SUBSTRATE ? 5 : field.isNumber() ? 0.4 : 2;
            add(boxes.get(field), new GridBagConstraints(field.ordinal(), 0, 1, 1, weight, 0, GridBagConstraints.NORTH,
                    GridBagConstraints.HORIZONTAL, new Insets(0, 0, 0, last ? 0 : theme.space("gap")), 0, 0));
        }
        boxes.get(StepField.EQUIVALENTS).setUsual(StepReader.USUAL_EQUIVALENTS);
        boxes.get(StepField.TEMPERATURE).setUsual(StepReader.USUAL_TEMPERATURE);
        boxes.get(StepField.CONCENTRATION).setUsual(StepReader.USUAL_CONCENTRATION);
        hints = new HintRow(theme, List.copyOf(boxes.values()));
        add(hints, new GridBagConstraints(0, 1, StepField.values().length, 1, 1, 0, GridBagConstraints.NORTH,
                GridBagConstraints.HORIZONTAL, new Insets(0, 0, 0, 0), 0, 0));
        fill();
    }

    StepText text() {
        return text;
    }

    /** Shows another step without telling the listener. */
    void show(StepText next) {
        text = next;
        fill();
    }

    private void fill() {
        boxes.forEach((field, box) -> box.setQuietly(text.get(field)));
    }

    private void edited(FieldBox box) {
        StepText next = text.with(box.kind(), box.text());
        text = box.kind() == StepField.SUBSTRATE ? next.withSite("") : next;
        Suggestions offers = suggestions.get(box.kind());
        if (offers != null) {
            offers.offer();
        }
        onEdit.accept(text);
    }

    /** Says below each field what is wrong with it, or what it was understood as. */
    void report(Outcome outcome) {
        boolean blank = outcome.text().get(StepField.SUBSTRATE).isEmpty();
        boxes.forEach((field, box) -> {
            String problem = outcome.problems().get(field);
            if (problem != null && blank && box.text().isBlank()) {
                // A new step is no mistake.
                box.line().hint(problem);
            } else if (problem != null) {
                box.line().problem(problem);
            } else {
                box.line().hint(outcome.shown().map(shown -> understood(field, shown.review().step())).orElse(""));
            }
        });
        outcome.shown().map(shown -> shown.review().step().solvent()).ifPresent(solvent -> boxes.get(StepField.WATER).setUsual(UsualWater.ppm(solvent)));
        hints.repaint();
    }

    private static String understood(StepField field, Step step) {
        return switch (field) {
            case SUBSTRATE -> remarks(step.substrate());
            case BASE -> StockWords.pKas(step.base());
            case SOLVENT -> StockWords.line(step.solvent());
            case PARTNER -> step.partner().map(StepStrip::remarks).orElse("");
            default -> "";
        };
    }

    private static String remarks(Molecule molecule) {
        List<String> remarks = new ArrayList<>();
        remarks.add(molecule.atomCount() + (molecule.atomCount() == 1 ? " heavy atom" : " heavy atoms"));
        if (!molecule.counterIons().isEmpty()) {
            remarks.add("beside it: " + String.join(", ", molecule.counterIons()));
        }
        remarks.addAll(molecule.warnings());
        return String.join("; ", remarks);
    }

    /** What is offered below a field while it is typed in; for base and solvent. */
    Suggestions suggestions(StepField field) {
        return suggestions.get(field);
    }

    FieldBox box(StepField field) {
        return boxes.get(field);
    }
}
