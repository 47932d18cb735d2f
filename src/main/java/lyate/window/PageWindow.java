package lyate.window;

import java.awt.Color;
import java.awt.Font;
import java.awt.Frame;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import javax.swing.JComponent;
import javax.swing.JDialog;
import javax.swing.JEditorPane;
import javax.swing.JScrollPane;
import javax.swing.KeyStroke;
import javax.swing.UIManager;
import javax.swing.text.html.HTMLDocument;
import javax.swing.text.html.HTMLEditorKit;

/** A page of text that comes with the program, such as the guide, in a window of its own; Escape closes it. */
final class PageWindow extends JDialog {

    private PageWindow(Frame owner, String title, String page, Theme theme) {
        super(owner, title, false);
        JEditorPane pane = new JEditorPane();
        HTMLEditorKit kit = new HTMLEditorKit();
        pane.setEditorKit(kit);
        // The style goes into this document alone: the kit's own style sheet is shared by the whole program.
        HTMLDocument document = (HTMLDocument) kit.createDefaultDocument();
        rules(document, theme);
        pane.setDocument(document);
        pane.setText(read(page));
        pane.setEditable(false);
        pane.setCaretPosition(0);
        pane.setBackground(theme.color("ground"));
        pane.getAccessibleContext().setAccessibleName(title);
        add(new JScrollPane(pane));
        getRootPane().registerKeyboardAction(event -> dispose(), KeyStroke.getKeyStroke("ESCAPE"), JComponent.WHEN_IN_FOCUSED_WINDOW);
        setSize(theme.space("page.width"), theme.space("page.height"));
        setLocationRelativeTo(owner);
        setDefaultCloseOperation(DISPOSE_ON_CLOSE);
    }

    /** @param page file name of an HTML resource beside this class */
    static void open(Frame owner, String title, String page, Theme theme) {
        new PageWindow(owner, title, page, theme).setVisible(true);
    }

    private static void rules(HTMLDocument document, Theme theme) {
        Font font = UIManager.getFont("Label.font");
        String ink = hex(theme.color("ink"));
        document.getStyleSheet().addRule(String.format(Locale.ROOT, "body { font-family: %s; font-size: %dpx; color: %s; margin: %dpx }",
                font.getFamily(Locale.ROOT), font.getSize(), ink, theme.space("margin")));
        document.getStyleSheet().addRule(String.format(Locale.ROOT, "h1 { font-size: %dpx }", Math.round(font.getSize2D() * 1.7f)));
        document.getStyleSheet().addRule(String.format(Locale.ROOT, "h2 { font-size: %dpx; color: %s }", Math.round(font.getSize2D() * 1.25f),
                hex(theme.color("site"))));
    }

    private static String hex(Color colour) {
        return String.format(Locale.ROOT, "#%06x", colour.getRGB() & 0xffffff);
    }

    private static String read(String page) {
        try (InputStream stream = PageWindow.class.getResourceAsStream(page)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
