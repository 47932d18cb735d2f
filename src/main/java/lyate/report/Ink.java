package lyate.report;

import java.awt.Color;
import lyate.molecule.DrawingColours;
import lyate.review.Finding.Severity;
import lyate.review.Verdict;

/** Colours of a report: told apart in any usual colour deficiency, dark enough for a black and white printer. */
final class Ink {

    static final String PAPER = "#ffffff";
    static final String TEXT = "#1d242b";
    static final String SOFT = "#55606b";
    static final String LINE = "#b5bec7";
    static final String SITE = "#1f5fa8";
    static final String SITE_GROUND = "#eaf1f9";
    static final String INTENDED = "#b34700";
    static final String INTENDED_GROUND = "#fdf0e6";
    static final String BASE = "#00695c";
    static final String SOLVENT = "#5b4b8a";
    private static final String STOP = "#a8321e";
    private static final String CAUTION = "#8a5a00";
    private static final String NOTE = "#3f5873";

    private Ink() {}

    /** Heteroatoms in their usual colours, darkened for paper. */
    static DrawingColours atoms() {
        return atomicNumber -> Color.decode(switch (atomicNumber) {
            case 7 -> "#2b52a3";
            case 8 -> "#a53a12";
            case 9, 17 -> "#3d6b1f";
            case 15 -> "#8f5700";
            case 16 -> "#7a6200";
            case 35 -> "#7d3a1d";
            case 53 -> "#5d3a86";
            default -> TEXT;
        });
    }

    static String of(Severity severity) {
        return switch (severity) {
            case STOP -> STOP;
            case CAUTION -> CAUTION;
            case NOTE -> NOTE;
        };
    }

    static String of(Verdict verdict) {
        return switch (verdict) {
            case SELECTIVE -> BASE;
            case PARTIAL -> CAUTION;
            case UNDECIDED -> NOTE;
            case TOO_WEAK, WRONG_SITE, LEVELLED, INCOMPATIBLE -> STOP;
        };
    }
}
