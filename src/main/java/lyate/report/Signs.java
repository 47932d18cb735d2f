package lyate.report;

import lyate.review.Finding.Severity;
import lyate.review.Verdict;

/**
 * Small signs whose shape says what their colour says: tick, half-filled circle, question mark or crossed octagon for a
 * verdict; octagon, triangle or circle for a severity. The word always stands beside them, so they are hidden from
 * screen readers.
 */
final class Signs {

    private static final String OCTAGON = "M5 0H11L16 5V11L11 16H5L0 11V5Z";

    private Signs() {}

    static String of(Verdict verdict) {
        String ink = Ink.of(verdict);
        return sign(switch (verdict) {
            case SELECTIVE -> fill("M8 0A8 8 0 0 1 8 16A8 8 0 0 1 8 0Z", ink) + stroke("M4.4 8.4L7 11L11.7 5.5", Ink.PAPER);
            case PARTIAL -> stroke("M8 1A7 7 0 0 1 8 15A7 7 0 0 1 8 1Z", ink) + fill("M8 1A7 7 0 0 0 8 15Z", ink);
            case UNDECIDED -> stroke("M8 1A7 7 0 0 1 8 15A7 7 0 0 1 8 1Z", ink) + stroke("M5.6 6.2A2.4 2.4 0 1 1 8 8.6V9.6M8 11.8V12.2", ink);
            case TOO_WEAK, WRONG_SITE, LEVELLED, INCOMPATIBLE -> fill(OCTAGON, ink) + stroke("M5.2 5.2L10.8 10.8M10.8 5.2L5.2 10.8", Ink.PAPER);
        });
    }

    static String of(Severity severity) {
        String ink = Ink.of(severity);
        return sign(switch (severity) {
            case STOP -> fill(OCTAGON, ink) + stroke("M8 3.6V8.8M8 11.8V12.2", Ink.PAPER);
            case CAUTION -> fill("M8 0L16 15.5H0Z", ink) + stroke("M8 5.6V10M8 12.6V12.8", Ink.PAPER);
            case NOTE -> fill("M8 0A8 8 0 0 1 8 16A8 8 0 0 1 8 0Z", ink) + stroke("M8 7.4V12M8 4V4.3", Ink.PAPER);
        });
    }

    /** A row that could not be judged. */
    static String notJudged() {
        return sign(stroke("M1 1H15V15H1ZM4 8H12", Ink.SOFT));
    }

    private static String sign(String shapes) {
        return "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"sign\" aria-hidden=\"true\" width=\"14\" height=\"14\" viewBox=\"0 0 16 16\">"
                + shapes + "</svg>";
    }

    private static String fill(String d, String ink) {
        return "<path fill=\"" + ink + "\" d=\"" + d + "\"/>";
    }

    private static String stroke(String d, String ink) {
        return "<path fill=\"none\" stroke=\"" + ink + "\" stroke-width=\"1.9\" stroke-linecap=\"round\" d=\"" + d + "\"/>";
    }
}
