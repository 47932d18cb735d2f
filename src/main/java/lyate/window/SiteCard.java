package lyate.window;

import com.formdev.flatlaf.util.UIScale;
import lyate.acidity.Acidity;
import lyate.acidity.Acidity.Contribution;
import lyate.acidity.Acidity.Relative;

/** The card shown over a site: its pKa taken apart. */
final class SiteCard {

    private static final int WIDTH = 360;

    private SiteCard() {}

    static String html(Shown shown, SiteTag site) {
        Acidity acidity = site.transfer().acidity();
        StringBuilder html = new StringBuilder("<html><div style='width:" + UIScale.scale(WIDTH) + "px'><b>" + site.letter() + " &nbsp; "
                + escape(site.label()) + "</b> &nbsp; pKa <b>" + site.value() + "</b> in " + escape(Words.medium(acidity.medium()))
                + ", " + acidity.basis().word() + "<br>" + Words.percent(site.transfer().percentTaken()) + " taken by "
                + escape(shown.review().workingBase()) + ", log K " + Words.signed(site.transfer().logK()));
        if (!acidity.contributions().isEmpty()) {
            html.append("<hr><table cellpadding=1>");
            for (Contribution term : acidity.contributions()) {
                html.append("<tr><td>").append(escape(term.text())).append("</td><td align=right>")
                        .append(term == acidity.contributions().get(0) ? Words.oneDecimal(term.value()) : Words.signed(term.value())).append("</td></tr>");
            }
            html.append("</table>");
        }
        for (String missing : acidity.missing()) {
            html.append("<br>Not accounted for: ").append(escape(missing));
        }
        if (!acidity.relatives().isEmpty()) {
            html.append("<hr>Nearest measured:<table cellpadding=1>");
            for (Relative relative : acidity.relatives()) {
                html.append("<tr><td>").append(escape(relative.smiles())).append("</td><td>").append(escape(relative.site()))
                        .append("</td><td align=right>").append(Words.oneDecimal(relative.pKa())).append("</td></tr>");
            }
            html.append("</table>");
        }
        return html.append("<hr>").append(escape(acidity.source())).append("</div></html>").toString();
    }

    static String escape(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
