package soakline.window.view;

import java.awt.BorderLayout;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import javax.swing.BorderFactory;
import javax.swing.ButtonGroup;
import javax.swing.JButton;
import javax.swing.JCheckBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JRadioButton;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import soakline.specimen.Faces;
import soakline.window.present.FactsAnswer;
import soakline.window.present.FactsAnswer.Field;
import soakline.window.present.Question;

/** Asks for what the file did not say. Nothing is filled in beforehand. */
final class MissingFactsView extends JPanel {

    private static final long serialVersionUID = 1L;

    private final transient Function<FactsAnswer, Map<Field, String>> take;
    private final JScrollPane scroll = new JScrollPane();
    private final Map<Field, JTextField> fields = new EnumMap<>(Field.class);
    private final Map<Field, WrappingText> complaints = new EnumMap<>(Field.class);
    private final JRadioButton both = new JRadioButton("Both faces");
    private final JRadioButton one = new JRadioButton("One face, the other sealed");
    private final JButton estimate = new JButton("Estimate");
    private Question question;
    private final JCheckBox forAll = new JCheckBox("Use this for every coupon of the file that lacks it");

    /**
     * @param take takes an answer and returns the complaints about it
     */
    MissingFactsView(Function<FactsAnswer, Map<Field, String>> take) {
        super(new BorderLayout());
        this.take = take;
        setName("missing-facts");
        scroll.setBorder(BorderFactory.createEmptyBorder());
        both.setName("faces-both");
        one.setName("faces-one");
        forAll.setName("for-all");
        both.setMnemonic('B');
        one.setMnemonic('N');
        forAll.setMnemonic('U');
        estimate.setName("estimate");
        estimate.setMnemonic('E');
        estimate.setToolTipText("Estimate with these facts");
        estimate.putClientProperty("FlatLaf.style", Look.MAIN_BUTTON);
        estimate.addActionListener(event -> submit());
        add(scroll);
    }

    void show(Question asked) {
        question = asked;
        fields.clear();
        complaints.clear();
        Column page = new Column("insets #40 #32 #32 #32", "[grow, left]", "");
        page.setBackground(Look.paper());
        Column form = new Column("insets 0, wrap 1, gapy #6", "[grow, fill, 0::]", "");
        form.setOpaque(false);
        form.put(new WrappingText(question.coupon(), "h2.font", "Label.foreground"), "growx, wmin 0");
        form.put(WrappingText.plain(question.introduction()), "growx, wmin 0, gapbottom #12");
        if (question.thickness()) {
            form.put(WrappingText.quiet(question.thicknessHelp()), "growx, wmin 0");
            field(form, Field.THICKNESS, 'T');
        }
        if (question.faces()) {
            faces(form, question);
        }
        if (question.size()) {
            form.put(WrappingText.quiet(question.sizeHelp()), "growx, wmin 0");
            field(form, Field.WIDTH, 'W');
            field(form, Field.LENGTH, 'L');
        }
        if (question.several()) {
            forAll.setSelected(false);
            forAll.setOpaque(false);
            form.put(forAll, "gaptop #6");
        }
        form.put(estimate, "grow 0, gaptop #12");
        page.put(form, "growx, wmin 0, wmax #560");
        scroll.setViewportView(page);
        scroll.getViewport().setBackground(Look.paper());
    }

    private void faces(Column form, Question question) {
        form.put(WrappingText.quiet(question.facesHelp()), "growx, wmin 0");
        ButtonGroup group = new ButtonGroup();
        group.add(both);
        group.add(one);
        group.clearSelection();
        both.setOpaque(false);
        one.setOpaque(false);
        Column row = new Column("insets 0, gapx #20", "[][]", "");
        row.setOpaque(false);
        row.put(both, "");
        row.put(one, "");
        form.put(row, "growx, wmin 0");
        complaint(form, Field.FACES);
    }

    private void field(Column form, Field field, char mnemonic) {
        JTextField text = new JTextField(22);
        text.setName("field-" + field.words());
        text.putClientProperty("JTextField.placeholderText", "such as " + field.example());
        text.setToolTipText("A number with its unit, such as " + field.example());
        JLabel label = new JLabel(capital(field.words()));
        label.setDisplayedMnemonic(mnemonic);
        label.setLabelFor(text);
        Column row = new Column("insets 0, gapx #8", "[#80!][0:#280:#280]", "");
        row.setOpaque(false);
        row.put(label, "");
        row.put(text, "growx, wmin 0");
        form.put(row, "growx, wmin 0");
        text.addActionListener(event -> estimate.doClick());
        fields.put(field, text);
        complaint(form, field);
    }

    private void complaint(Column form, Field field) {
        WrappingText text = new WrappingText("", "defaultFont", "Soakline.fail");
        text.setName("complaint-" + field.words());
        text.setVisible(false);
        complaints.put(field, text);
        form.put(text, "growx, wmin 0, hidemode 3, gapbottom #8");
    }

    private void submit() {
        Map<Field, String> texts = new EnumMap<>(Field.class);
        fields.forEach((field, text) -> texts.put(field, text.getText()));
        Map<Field, String> faults =
                take.apply(new FactsAnswer(texts, chosen(), question.several() && forAll.isSelected()));
        complaints.forEach((field, text) -> {
            String fault = faults.getOrDefault(field, "");
            text.setText(fault);
            text.getAccessibleContext().setAccessibleName(fault);
            text.setVisible(!fault.isEmpty());
        });
        fields.forEach((field, text) ->
                text.putClientProperty("JComponent.outline", faults.containsKey(field) ? "error" : null));
        revalidate();
    }

    private Optional<Faces> chosen() {
        if (both.isSelected()) {
            return Optional.of(Faces.BOTH);
        }
        return one.isSelected() ? Optional.of(Faces.ONE) : Optional.empty();
    }

    private static String capital(String words) {
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
