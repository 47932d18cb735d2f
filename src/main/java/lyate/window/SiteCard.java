package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import lyate.acidity.Acidity;
import lyate.report.LetteredSite;
import lyate.report.Recipe;
import lyate.report.Recipe.Line;
import lyate.report.Words;

/** The card shown over a site: its pKa taken apart. */
final class SiteCard {

    private static final int WIDTH = 360;

    private SiteCard() {}

    static String html(Shown shown, LetteredSite site) {
        Acidity acidity = site.transfer().acidity();
        StringBuilder html = new StringBuilder("<html><div style='width:" + UIScale.scale(WIDTH) + "px'>");
        html.append("<b>").append(site.letter()).append(" &nbsp; ").append(escape(site.label())).append("</b> &nbsp; pKa <b>")
                .append(site.value()).append("</b> in ").append(escape(Words.medium(acidity.medium()))).append(", ")
                .append(acidity.basis().word()).append("<br>")
                .append(escape(Words.percent(site.transfer().percentTaken()))).append(" taken by ").append(escape(shown.review().workingBase()))
                .append(", log K ").append(Words.signed(site.transfer().logK())).append("<br>")
                .append(escape(Words.sentence(site.transfer().decidedBy()))).append('.');
        Recipe recipe = Recipe.of(acidity, shown.review().step().substrate()::label);
        html.append("<hr><table width='100%' cellpadding=1 cellspacing=0>");
        for (Line line : recipe.lines()) {
            boolean first = line == recipe.lines().get(0);
            row(html, left(line), escape(line.effect()), right(line, first));
        }
        return html.append("</table><hr>").append(escape(acidity.source())).append("</div></html>").toString();
    }

    private static String left(Line line) {
        String text = escape(line.text());
        String atoms = line.atoms().isEmpty() ? "" : " (" + escape(String.join(" ", line.atoms())) + ")";
        return switch (line.part()) {
            case CONTRIBUTION -> text + atoms;
            case PKA -> "<b>pKa</b>";
            case OTHER_WAY -> "another way: " + text;
            case MISSING -> "not accounted for: " + text;
            case RELATIVE -> "measured: " + text + atoms;
            case UNCERTAINTY -> "uncertainty: " + text;
        };
    }

    private static String right(Line line, boolean first) {
        return switch (line.part()) {
            case CONTRIBUTION -> first ? Words.oneDecimal(line.value().getAsDouble()) : Words.signed(line.value().getAsDouble());
            case PKA -> "<b>" + Words.withSigma(line.value().getAsDouble(), line.sigma().getAsDouble()) + "</b>";
            case OTHER_WAY -> Words.withSigma(line.value().getAsDouble(), line.sigma().getAsDouble());
            case RELATIVE -> Words.oneDecimal(line.value().getAsDouble());
            case UNCERTAINTY -> Words.oneDecimal(line.sigma().getAsDouble());
            case MISSING -> "";
        };
    }

    private static void row(StringBuilder html, String left, String middle, String right) {
        html.append("<tr><td>").append(left).append("</td><td>").append(middle).append("</td><td align=right>").append(right).append("</td></tr>");
    }

    static String escape(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
