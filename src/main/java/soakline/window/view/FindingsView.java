package soakline.window.view;

import java.awt.BorderLayout;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.ScrollPaneConstants;
import javax.swing.SwingUtilities;
import soakline.inference.Verdict;
import soakline.window.present.Findings;
import soakline.window.present.Findings.CheckLine;
import soakline.window.present.Findings.Headline;
import soakline.window.present.Findings.Row;

/** What there is to say about the coupon: the verdict, the parameters, the checks, and every sentence that goes with them. */
final class FindingsView extends JPanel {

    private static final long serialVersionUID = 1L;

    private static final int LONG_HEADLINE = 22;
    private static final String PLAIN = "defaultFont";
    private static final String TEXT = "Label.foreground";
    private static final String QUIET = "Soakline.quietText";

    private final JScrollPane scroll = new JScrollPane(
            null, ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED, ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);

    FindingsView() {
        super(new BorderLayout());
        setName("findings");
        scroll.setBorder(BorderFactory.createEmptyBorder());
        scroll.getAccessibleContext().setAccessibleName("Findings");
        add(scroll);
    }

    void show(Findings findings) {
        Column column = new Column("insets #16 #18 #20 #16, wrap 1, gapy #6", "[grow, fill, 0::]", "");
        column.setBackground(Look.paper());
        // so that the arrow and page keys can scroll it
        column.setFocusable(true);
        column.getAccessibleContext().setAccessibleName("Findings");
        headline(column, findings.headline());
        sentences(column, "Problems", findings.problems(), Verdict.CAUTION);
        parameters(column, findings);
        checks(column, findings.checks());
        sentences(column, "Cautions", findings.cautions(), null);
        sentences(column, "Notes", findings.notes(), null);
        rows(column, "Coupon", findings.coupon());
        scroll.setViewportView(column);
        scroll.getViewport().setBackground(Look.paper());
        SwingUtilities.invokeLater(() -> {
            column.settle();
            scroll.getVerticalScrollBar().setValue(0);
        });
    }

    private static void headline(Column column, Headline headline) {
        JLabel mark = mark(headline.verdict(), 22);
        column.put(mark, "split 2, top, gaptop #3, w #22!, grow 0");
        WrappingText large = new WrappingText(
                headline.large(), headline.large().length() > LONG_HEADLINE ? "h2.font" : "h1.font", TEXT);
        large.setName("headline");
        column.put(large, "growx, pushx, wmin 0, gapleft #8");
        WrappingText small = WrappingText.quiet(headline.small());
        small.setName("headline-small");
        column.put(small, "growx, wmin 0");
    }

    private static void parameters(Column column, Findings findings) {
        section(column, "Parameters");
        Column table =
                new Column("insets 0, wrap 3, gapx #8, gapy #5", tableColumns(column, findings.parameters()), "");
        table.setOpaque(false);
        table.put(WrappingText.quiet("Name"), "wmin 0, growx");
        table.put(WrappingText.quiet("Value"), "wmin 0, growx");
        table.put(WrappingText.quiet(findings.intervalHead()), "wmin 0, growx");
        for (Row row : findings.parameters()) {
            table.put(WrappingText.plain(row.name()), "wmin 0, growx");
            table.put(new WrappingText(row.value(), "h4.font", TEXT), "wmin 0, growx");
            table.put(WrappingText.plain(row.extra()), "wmin 0, growx");
        }
        column.put(table, "growx, wmin 0");
        if (!findings.contributions().isEmpty()) {
            column.put(WrappingText.quiet(findings.contributions()), "growx, wmin 0");
        }
    }

    /** Value and interval on one line each, and what is left to the name. */
    private static String tableColumns(Column column, List<Row> rows) {
        int value = 0;
        int interval = 0;
        for (Row row : rows) {
            value = Math.max(value, column.getFontMetrics(Look.font("h4.font")).stringWidth(row.value()));
            interval =
                    Math.max(interval, column.getFontMetrics(Look.font(PLAIN)).stringWidth(row.extra()));
        }
        // a little more than the words, for text areas wrap at their very edge
        int slack = Look.px(4);
        return "[grow, fill, 0::][" + (value + slack) + "px!, fill][" + (interval + slack) + "px!, fill]";
    }

    private static void checks(Column column, List<CheckLine> checks) {
        section(column, "Checks");
        for (CheckLine check : checks) {
            Column line = new Column("insets 0 0 #4 0, gapx #8, gapy #1", "[#16!][grow, fill, 0::]", "");
            line.setOpaque(false);
            line.put(mark(check.verdict(), 16), "top, gaptop #1");
            line.put(new WrappingText(check.name() + ": " + check.word(), "h4.font", TEXT), "growx, wmin 0, wrap");
            line.put(new WrappingText(check.sentence(), PLAIN, TEXT), "skip 1, growx, wmin 0, wrap");
            if (!check.detail().isEmpty()) {
                line.put(new WrappingText(check.detail(), PLAIN, QUIET), "skip 1, growx, wmin 0, wrap");
            }
            column.put(line, "growx, wmin 0");
        }
    }

    private static void sentences(Column column, String title, List<String> sentences, Verdict verdict) {
        if (sentences.isEmpty()) {
            return;
        }
        section(column, title);
        for (String sentence : sentences) {
            if (verdict == null) {
                column.put(WrappingText.plain(sentence), "growx, wmin 0");
            } else {
                Column line = new Column("insets 0, gapx #8", "[#16!][grow, fill, 0::]", "");
                line.setOpaque(false);
                line.put(mark(verdict, 16), "top, gaptop #1");
                line.put(WrappingText.plain(sentence), "growx, wmin 0");
                column.put(line, "growx, wmin 0");
            }
        }
    }

    private static void rows(Column column, String title, List<Row> rows) {
        section(column, title);
        Column table = new Column("insets 0, wrap 2, gapx #12, gapy #4", "[fill, 0:#110:][grow, fill, 0::]", "");
        table.setOpaque(false);
        for (Row row : rows) {
            table.put(WrappingText.quiet(row.name()), "wmin 0, growx");
            table.put(WrappingText.plain(row.value()), "wmin 0, growx");
        }
        column.put(table, "growx, wmin 0");
    }

    private static void section(Column column, String title) {
        JLabel label = new JLabel(title);
        label.setFont(Look.font("h3.font"));
        label.setBorder(BorderFactory.createCompoundBorder(
                BorderFactory.createMatteBorder(1, 0, 0, 0, Look.line()),
                BorderFactory.createEmptyBorder(Look.px(8), 0, 0, 0)));
        column.put(label, "growx, gaptop #10");
    }

    private static JLabel mark(Verdict verdict, int size) {
        JLabel mark = new JLabel(new VerdictIcon(verdict, size));
        mark.getAccessibleContext().setAccessibleName(verdict.code());
        mark.setToolTipText(verdict.code());
        return mark;
    }
}
