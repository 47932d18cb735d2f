package lyate.report;

import java.util.ArrayList;
import java.util.List;
import lyate.bench.GroupHazard;
import lyate.bench.Quench;
import lyate.bench.WorkUp.Parting;
import lyate.bench.WorkUpKit.Answer;

/** A work-up in sentences. */
public final class WorkUpWords {

    private WorkUpWords() {}

    /** Where the product goes, what it parts from at which pH, the quench, what the water hurts, what was assumed. */
    public static List<String> lines(Answer answer) {
        List<String> lines = new ArrayList<>();
        lines.add(answer.workUp().productSentence());
        answer.workUp().partings().stream().map(Parting::sentence).forEach(lines::add);
        if (!answer.refusal().isEmpty()) {
            lines.add("No quench: " + answer.refusal() + ".");
        }
        answer.quench().ifPresent(quench -> {
            lines.add(acidLine(quench));
            lines.addAll(quench.sentences());
        });
        for (GroupHazard hazard : answer.hazards()) {
            lines.add(Words.sentence(hazard.severity().word()) + ": " + hazard.sentence() + " (" + hazard.source() + ")");
        }
        if (!answer.workUp().product().withoutPKa().isEmpty()) {
            lines.add("No pKa in water is known for " + String.join(", ", answer.workUp().product().withoutPKa()) + "; left out.");
        }
        lines.add(answer.workUp().assumption());
        return lines;
    }

    private static String acidLine(Quench quench) {
        StringBuilder line = new StringBuilder(Words.sentence(quench.acidName()) + " to pH " + Words.oneDecimal(quench.pH()) + ": " + Words.number(quench.acid().milliMole()) + " mmol");
        quench.acid().grams().ifPresent(grams -> line.append(", ").append(Words.number(grams)).append(" g"));
        quench.acid().milliLitre().ifPresent(volume -> line.append(", ").append(Words.number(volume)).append(" mL"));
        return line.append(" (").append(quench.acid().form()).append(").").toString();
    }
}
