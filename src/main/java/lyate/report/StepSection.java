package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import lyate.bench.Amounts;
import lyate.molecule.Molecule;
import lyate.review.BaseHazards;
import lyate.review.Finding;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;
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
        html.element("h2", "Step " + facts.row().row().name(), "id", id + "-h");
        verdict();
        figures();
        conditions();
        transfers();
        findings();
        amounts();
        safety();
        reasons();
        sources();
        return html.close().toString();
    }

    private void verdict() {
        html.open("div", "class", "verdict");
        html.open("p", "class", "answer").markup(Signs.of(review.verdict())).element("strong", Words.verdict(review.verdict()))
                .element("span", "probability " + Words.probability(review.probability())).close();
        html.element("p", Words.sentence(review.verdict().meaning()) + ". " + whatGoes());
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

    private void figures() {
        html.open("figure", "class", "wide").markup(new DrawingFigure(step.substrate(), facts.sites()).write(id + "-drawing"));
        html.element("figcaption", "Proton sites: letter, pKa \u00b1 standard uncertainty. Thick arc: share of protons taken at equilibrium."
                + " Double ring: the intended site.").close();
        html.open("div", "class", "pair");
        facts.anchor().ifPresent(anchor -> {
            Ladder ladder = Ladder.of(review, facts.sites(), List.of(), Optional.empty()).orElseThrow();
            html.open("figure").markup(new LadderFigure(anchor, ladder).write(id + "-ladder"));
            html.element("figcaption", "Acidity ladder: sites left; base (triangle) and solvent (square) right; bars are standard uncertainties.").close();
        });
        facts.doses().ifPresent(doses -> {
            html.open("figure").markup(new DoseFigure(doses, facts.sites(), step.equivalents()).write(id + "-dose"));
            html.element("figcaption", "Dose curve: share of protons taken at equilibrium; solid line: the intended site.").close();
        });
        html.close();
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
        pair("Temperature, concentration", Words.celsius(step.temperatureCelsius()) + ", " + Words.chosen(step.concentrationMolar()) + " mol/L of substrate");
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
            if (!known && !ReviewCells.COLUMNS.contains(name) && !row.cells().get(i).isEmpty()) {
                others.put(Words.sentence(name), row.cells().get(i));
            }
        }
        return others;
    }

    private void pair(String name, String value) {
        html.open("tr").element("th", name, "scope", "row").element("td", value).close();
    }

    private void transfers() {
        html.open("div", "class", "whole").element("h3", "Transfers");
        HtmlTable table = new HtmlTable(html, "transfers", "Every donor against " + review.workingBase(),
                List.of("Site", "Donor", "pKa", "Scale", "Value is", "log K", "\u0394G, kJ/mol", "Taken", "Reason"));
        List<String> reasons = review.transfers().stream().map(Transfer::decidedBy).distinct().toList();
        for (Transfer transfer : review.transfers()) {
            String letter = facts.sites().stream().filter(site -> site.transfer().equals(transfer)).map(LetteredSite::letter).findFirst().orElse("");
            boolean intended = transfer.donor().equals(review.intendedSite());
            table.row(letter, transfer.donor() + (intended ? ", intended" : ""), Words.withSigma(transfer.acidity()),
                    Words.medium(transfer.acidity().medium()), transfer.acidity().basis().word(),
                    Words.withSigma(transfer.logK(), transfer.sigmaLogK()), Words.minus(Numbers.fixed(transfer.deltaG(), 0)),
                    Words.percent(transfer.percentTaken()), Integer.toString(reasons.indexOf(transfer.decidedBy()) + 1));
        }
        table.end();
        html.element("p", "Which scale decides, and why:", "class", "source").open("ol");
        reasons.forEach(reason -> html.element("li", reason));
        html.close().close();
    }

    private void findings() {
        html.element("h3", "Findings");
        if (review.findings().isEmpty()) {
            html.element("p", "None.");
        }
        for (Finding finding : review.findings()) {
            html.open("div", "class", "finding");
            html.open("p").markup(Signs.of(finding.severity())).element("strong", Words.sentence(finding.severity().word()) + ", "
                    + finding.kind().code().replace('-', ' ') + ":").text(" " + finding.sentence()).close();
            // The standing line closes the safety note of every step; once is enough.
            List<String> details = new ArrayList<>(finding.evidence().stream().filter(fact -> !fact.equals(BaseHazards.STANDING_LINE)).toList());
            if (!finding.atoms().isEmpty()) {
                details.add("Atoms: " + String.join(", ", finding.atoms().stream().map(step.substrate()::label).toList()));
            }
            bullets(details);
            html.element("p", "Source: " + finding.source(), "class", "source").close();
        }
    }

    private void amounts() {
        Amounts amounts = facts.amounts();
        html.open("div", "class", "whole").element("h3", "Amounts");
        HtmlTable table = new HtmlTable(html, "amounts", "For " + Words.chosen(amounts.batch().milliMole()) + " mmol of substrate",
                List.of("What", "mmol", "g", "mL", "Remark"));
        table.row("substrate", Words.number(amounts.batch().milliMole()), Words.number(amounts.batch().grams()), "", "counter-ions included");
        table.row(step.solvent().name(), "", "", Words.number(amounts.solventMilliLitre()), "for " + Words.chosen(step.concentrationMolar()) + " mol/L");
        table.row(step.base().name(), Words.number(amounts.base().milliMole()), number(amounts.base().grams()), number(amounts.base().milliLitre()),
                Words.chosen(step.equivalents()) + " equivalents; " + amounts.base().form());
        amounts.spending().forEach(spent -> table.row("protons of " + spent.what(), Words.number(spent.milliMole()), "", "",
                "met before or at the intended site"));
        table.row("base that just covers these", Words.number(amounts.baseNeeded().milliMole()), number(amounts.baseNeeded().grams()),
                number(amounts.baseNeeded().milliLitre()), "");
        table.row(amounts.excess() < 0 ? "base missing" : "base left over", Words.number(Math.abs(amounts.excess())), "", "", "counted in protons");
        table.end();
        bullets(amounts.warnings());
        html.close();
    }

    private static String number(OptionalDouble value) {
        return value.isPresent() ? Words.number(value.getAsDouble()) : "";
    }

    private void safety() {
        html.element("h3", "Safety note").open("div", "class", "safety");
        List<String> lines = new ArrayList<>();
        facts.gasAndHeat().kiloJoule().ifPresent(heat -> lines.add("Heat if all the base went in at once: " + Words.number(heat) + " kJ."));
        List<String> cautions = facts.gasAndHeat().cautions();
        lines.addAll(cautions.subList(0, cautions.size() - 1));
        bullets(lines);
        html.element("p", cautions.get(cautions.size() - 1), "class", "standing").close();
    }

    private void reasons() {
        html.element("h3", "Why");
        bullets(review.explanation());
        html.element("h3", "Assumed");
        bullets(Assumptions.of(facts.row().row(), review));
    }

    private void sources() {
        html.element("h3", "Sources");
        HtmlTable table = new HtmlTable(html, "sources", "Values in use", List.of("Used for", "Value", "Source"));
        StepSources.of(facts).forEach(use -> table.row(use.what(), use.value(), use.source()));
        table.end();
    }

    private void bullets(List<String> lines) {
        if (!lines.isEmpty()) {
            html.open("ul");
            lines.forEach(line -> html.element("li", line));
            html.close();
        }
    }
}
