package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Verdict;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetRow;

/** One judged step as a section of the report. */
final class StepSection {

    private static final double WORTH_A_WORD = 0.05;

    private final StepFacts facts;
    private final Review review;
    private final Step step;
    private final String id;
    private final Html html = new Html();

    StepSection(StepFacts facts, String id) {
        this.facts = facts;
        this.review = facts.review();
        this.step = review.step();
        this.id = id;
    }

    String write() {
        html.open("section", "class", "step", "id", id, "aria-labelledby", id + "-h");
        row("title", () -> html.element("h2", "Step " + facts.row().row().name(), "id", id + "-h"), this::verdict);
        row("wide-narrow", this::drawing, this::conditions);
        row("thirds", this::ladder, this::doseCurve, this::safety);
        row("transfers-amounts", this::transfers, () -> AmountTable.write(html, step, facts.amounts()));
        FindingList.write(html, review);
        html.element("h3", "Assumed").halves("ul", Assumptions.of(facts.row().row(), review).stream()
                .map(assumed -> new Html().element("li", assumed).toString()).toList());
        sources();
        return html.close().toString();
    }

    private void verdict() {
        html.open("div", "class", "verdict");
        html.open("p", "class", "answer").markup(Signs.of(review.verdict())).element("strong", Words.verdict(review.verdict()))
                .element("span", "probability " + Words.probability(review.probability())).close();
        html.element("p", Words.sentence(review.meaning()) + ". " + whatGoes());
        String others = review.probabilities().entrySet().stream()
                .filter(entry -> entry.getKey() != review.verdict() && entry.getValue() >= WORTH_A_WORD)
                .sorted(Map.Entry.<Verdict, Double>comparingByValue().reversed())
                .map(entry -> Words.verdict(entry.getKey()).toLowerCase(Locale.ROOT) + " " + Words.probability(entry.getValue()))
                .collect(Collectors.joining(", "));
        if (!others.isEmpty()) {
            html.element("p", "Otherwise: " + others + ".");
        }
        html.close();
    }

    private String whatGoes() {
        String first = review.firstSite().equals(review.intendedSite()) ? "The proton at " + review.intendedSite() + " goes first"
                : "Meant: " + review.intendedSite() + "; first to go: " + review.firstSite();
        return first + ". At " + review.intendedSite() + " log K is " + Words.signed(review.logK()) + " and " + (review.sideReactionWins() ? "the side reaction left aside, " : "")
                + Words.percent(review.intendedPercent()) + " is taken; elsewhere at most " + Words.percent(review.otherPercent()) + ".";
    }

    /** Things side by side, where there is room. */
    private void row(String kind, Runnable... cells) {
        html.open("div", "class", "row " + kind);
        for (Runnable cell : cells) {
            html.open("div", "class", "cell");
            cell.run();
            html.close();
        }
        html.close();
    }

    private void drawing() {
        html.open("figure").markup(new DrawingFigure(step.substrate(), facts.sites()).write(id + "-drawing")).close();
    }

    private void transfers() {
        new TransferTable(facts).write(html);
        html.element("h3", "Why").bullets(review.explanation());
    }

    private void ladder() {
        facts.anchor().ifPresent(anchor -> {
            Ladder ladder = Ladder.of(review, facts.sites(), List.of(), Optional.empty()).orElseThrow();
            html.open("figure").markup(new LadderFigure(anchor, ladder).write(id + "-ladder")).close();
        });
    }

    private void doseCurve() {
        facts.doses().ifPresent(doses -> {
            html.open("figure").markup(new DoseFigure(doses, facts.sites(), step.equivalents()).write(id + "-dose"));
            html.element("figcaption", DoseText.milestones(doses, review.intendedSite())).close();
        });
    }

    private void conditions() {
        Molecule substrate = step.substrate();
        html.element("h3", "Conditions").open("table", "class", "pairs").open("tbody");
        pair("Substrate", substrate.smiles() + "  (" + substrate.formula() + ", " + Numbers.fixed(substrate.molarMass(), 2) + " g/mol)");
        if (!substrate.input().strip().equals(substrate.smiles())) {
            pair("as given", substrate.input().strip());
        }
        if (!substrate.counterIons().isEmpty()) {
            pair("set aside", String.join(", ", substrate.counterIons()));
        }
        substrate.warnings().forEach(warning -> pair("note", warning));
        pair("Intended site", review.intendedSite() + step.origin().map(origin -> " (" + Words.origin(origin) + ")").orElse(""));
        pair("Base", step.base().name() + ", " + Words.chosen(step.equivalents()) + " equivalents");
        if (!review.workingBase().equals(step.base().name())) {
            pair("Working base", review.workingBase());
        }
        pair("Solvent", step.solvent().name() + ", water " + Numbers.fixed(step.waterPpm(), 0) + " ppm by mass");
        pair("At", Words.celsius(step.temperatureCelsius()) + ", " + Words.chosen(step.concentrationMolar()) + " mol/L of substrate");
        step.partner().ifPresent(partner -> pair("Electrophile", partner.smiles()));
        passedThrough().forEach(this::pair);
        html.close().close();
    }

    /** Notes and columns that mean nothing to the program. */
    private Map<String, String> passedThrough() {
        SheetRow row = facts.row().row();
        Map<String, String> others = new LinkedHashMap<>();
        for (int i = 0; i < row.cells().size(); i++) {
            String name = row.header().names().get(i);
            boolean known = SheetColumn.headers().contains(name) && !name.equals(SheetColumn.NOTES.header());
            if (!known && !ReviewCells.COLUMNS.contains(name) && !row.cells().get(i).isBlank()) {
                others.put(Words.sentence(name), row.cells().get(i));
            }
        }
        return others;
    }

    private void pair(String name, String value) {
        html.open("tr").element("th", name, "scope", "row").element("td", value).close();
    }

    private void safety() {
        html.element("h3", "Safety note").open("div", "class", "safety");
        List<String> lines = new ArrayList<>();
        facts.gasAndHeat().heatSentence().ifPresent(lines::add);
        List<String> cautions = facts.gasAndHeat().cautions();
        lines.addAll(cautions.subList(0, cautions.size() - 1));
        html.bullets(lines);
        html.element("p", cautions.get(cautions.size() - 1), "class", "standing").close();
    }

    private void sources() {
        html.element("h3", "Sources of the values").open("div", "class", "sources").halves("ul", StepSources.bySource(facts).entrySet().stream()
                .map(source -> new Html().open("li").element("em", source.getKey() + ":").text(" " + String.join("; ", source.getValue())).close()
                        .toString()).toList()).close();
    }
}
