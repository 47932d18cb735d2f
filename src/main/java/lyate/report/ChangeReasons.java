package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetColumn;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** What differs between two reviews of one step: what was asked, the values used, what came out. */
final class ChangeReasons {

    private static final String TO = " \u2192 ";

    private final List<String> said = new ArrayList<>();

    private ChangeReasons() {}

    static List<String> between(ReviewedRow before, ReviewedRow after) {
        ChangeReasons reasons = new ChangeReasons();
        for (SheetColumn column : SheetColumn.values()) {
            reasons.difference("sheet, " + column.header(), before.row().text(column), after.row().text(column));
        }
        reasons.difference("row cannot be used", before.problem(), after.problem());
        if (before.review().isPresent() && after.review().isPresent()) {
            reasons.values(before.review().get(), after.review().get());
            reasons.outcome(before.review().get(), after.review().get());
        }
        return reasons.said;
    }

    private void values(Review before, Review after) {
        difference("working base", before.workingBase(), after.workingBase());
        if (before.step().base().id().equals(after.step().base().id())) {
            Set<String> media = new TreeSet<>();
            before.step().base().pKas().keySet().forEach(medium -> media.add(medium.id()));
            after.step().base().pKas().keySet().forEach(medium -> media.add(medium.id()));
            media.forEach(id -> difference("pKa of the conjugate acid of " + after.step().base().name() + " in " + Words.medium(new Medium(id)),
                    value(before.step().base().pKa(new Medium(id))), value(after.step().base().pKa(new Medium(id)))));
        }
        if (before.step().substrate().canonicalKey().equals(after.step().substrate().canonicalKey())) {
            Set<String> telling = new LinkedHashSet<>(List.of(after.intendedSite(), before.intendedSite(), after.firstSite(), before.firstSite()));
            telling.forEach(site -> transfers(site, transfer(before, site), transfer(after, site)));
        }
    }

    private void transfers(String site, Optional<Transfer> before, Optional<Transfer> after) {
        if (before.isPresent() && after.isPresent()) {
            difference("pKa of " + site, value(before.get()), value(after.get()));
            difference("which scale decides at " + site, before.get().decidedBy(), after.get().decidedBy());
        }
    }

    private void outcome(Review before, Review after) {
        difference("intended site", before.intendedSite(), after.intendedSite());
        difference("first to go", before.firstSite(), after.firstSite());
        difference("log K at the intended site", Words.signed(before.logK()), Words.signed(after.logK()));
        difference("probability", Words.probability(before.probability()), Words.probability(after.probability()));
        difference("intended protons taken", Words.percent(before.intendedPercent()), Words.percent(after.intendedPercent()));
        List<String> gained = without(codes(after), codes(before));
        List<String> lost = without(codes(before), codes(after));
        if (!gained.isEmpty()) {
            said.add("findings gained: " + String.join(", ", gained));
        }
        if (!lost.isEmpty()) {
            said.add("findings lost: " + String.join(", ", lost));
        }
    }

    /** Finding codes of a review, each once, in its order. */
    static List<String> codes(Review review) {
        return review.findings().stream().map(finding -> finding.kind().code()).distinct().toList();
    }

    /** Those of the first list that are not in the second. */
    static List<String> without(List<String> all, List<String> others) {
        return all.stream().filter(code -> !others.contains(code)).toList();
    }

    private static Optional<Transfer> transfer(Review review, String donor) {
        return review.transfers().stream().filter(transfer -> transfer.donor().equals(donor)).findFirst();
    }

    private static String value(Optional<KnownPKa> known) {
        return known.map(pKa -> Words.withSigma(pKa.pKa(), pKa.sigma()) + " (" + pKa.source() + ")").orElse("not known");
    }

    private static String value(Transfer transfer) {
        return Words.withSigma(transfer.acidity()) + " in " + Words.medium(transfer.acidity().medium()) + ", "
                + transfer.acidity().basis().word() + " (" + transfer.acidity().source() + ")";
    }

    private void difference(String what, String before, String after) {
        if (!Objects.equals(before, after)) {
            said.add(what + ": " + (before.isEmpty() ? "nothing" : before) + TO + (after.isEmpty() ? "nothing" : after));
        }
    }
}
