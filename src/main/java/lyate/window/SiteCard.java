package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import java.util.Locale;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Relative;

/** The card shown over a site: its pKa taken apart. */
final class SiteCard {

    private static final int WIDTH = 360;

    private SiteCard() {}

    static String html(Shown shown, SiteTag site) {
        Acidity acidity = site.transfer().acidity();
        StringBuilder html = new StringBuilder("<html><div style='width:" + UIScale.scale(WIDTH) + "px'>");
        html.append("<b>").append(site.letter()).append(" &nbsp; ").append(escape(site.label())).append("</b> &nbsp; pKa <b>")
                .append(site.value()).append("</b> in ").append(escape(Words.medium(acidity.medium()))).append(", ")
                .append(acidity.basis().word()).append("<br>")
                .append(escape(Words.percent(site.transfer().percentTaken()))).append(" taken by ").append(escape(shown.review().workingBase()))
                .append(", log K ").append(Words.signed(site.transfer().logK())).append("<br>")
                .append(escape(Words.sentence(site.transfer().decidedBy()))).append('.');
        if (!acidity.contributions().isEmpty()) {
            recipe(acidity, html);
        }
        for (String missing : acidity.missing()) {
            html.append("<br>Not accounted for: ").append(escape(missing));
        }
        if (!acidity.relatives().isEmpty()) {
            relatives(acidity, html);
        }
        return html.append("<hr>").append(escape(acidity.source())).append("</div></html>").toString();
    }

    /** The terms of the estimate, as a sum. */
    private static void recipe(Acidity acidity, StringBuilder html) {
        html.append("<hr><table width='100%' cellpadding=1 cellspacing=0>");
        boolean first = true;
        for (Contribution term : acidity.contributions()) {
            row(html, escape(term.text()), term.effect().name().toLowerCase(Locale.ROOT).replace('_', ' '),
                    first ? Words.oneDecimal(term.value()) : Words.signed(term.value()));
            first = false;
        }
        row(html, "<b>pKa</b>", "", "<b>" + Words.withSigma(acidity) + "</b>");
        html.append("</table>");
    }

    private static void relatives(Acidity acidity, StringBuilder html) {
        html.append("<hr>Nearest measured compounds<table width='100%' cellpadding=1 cellspacing=0>");
        for (Relative relative : acidity.relatives()) {
            row(html, escape(relative.smiles()), escape(relative.site()), Words.oneDecimal(relative.pKa()));
        }
        html.append("</table>");
    }

    private static void row(StringBuilder html, String left, String middle, String right) {
        html.append("<tr><td>").append(left).append("</td><td>").append(middle).append("</td><td align=right>").append(right).append("</td></tr>");
    }

    static String escape(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
