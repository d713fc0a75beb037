package soakline.window.view;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Dimension;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import javax.swing.BorderFactory;
import javax.swing.ButtonGroup;
import javax.swing.JFrame;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JPanel;
import javax.swing.JRadioButtonMenuItem;
import javax.swing.JSplitPane;
import javax.swing.WindowConstants;
import soakline.session.BackgroundTasks;
import soakline.window.present.CouponService;
import soakline.window.present.WindowPresenter;
import soakline.window.present.WindowState;
import soakline.window.present.WindowState.Asking;
import soakline.window.present.WindowState.Content;
import soakline.window.present.WindowState.Result;
import soakline.window.present.WindowState.Unusable;
import soakline.window.present.WindowState.Welcome;

/** The frame and its parts. Draws the presenter's state and passes on what the user does. */
final class MainWindow {

    private static final Dimension USUAL_SIZE = new Dimension(1400, 900);
    private static final Dimension LEAST_SIZE = new Dimension(640, 480);
    /** Digits side by side: the table of parameters must fit whatever the font. */
    private static final int FINDINGS_DIGITS = 58;

    private final JFrame frame = new JFrame("Soakline");
    private final WindowPreferences preferences;
    private final WindowPresenter presenter;
    private final OpenAction open;
    private final ToolBar toolBar;
    private final MessageBar messageBar;
    private final StatusBar statusBar;
    private final CardLayout cards = new CardLayout();
    private final JPanel content = new JPanel(cards);
    private final WelcomeView welcomeView;
    private final MissingFactsView missingFactsView;
    private final ChartView chartView = new ChartView();
    private final FindingsView findingsView = new FindingsView();
    private final JSplitPane result = new JSplitPane(JSplitPane.HORIZONTAL_SPLIT, chartView, findingsView);
    /** What the parts show now; a part that shows it already is left alone, with its scroll place and its typed text. */
    private Content shown;

    MainWindow(CouponService service, BackgroundTasks tasks, WindowPreferences preferences) {
        this.preferences = preferences;
        this.presenter = new WindowPresenter(service, tasks, this::show);
        this.open = new OpenAction(frame, preferences, presenter::open);
        this.toolBar = new ToolBar(open, presenter::select);
        this.messageBar = new MessageBar(presenter::closeMessage);
        this.statusBar = new StatusBar(presenter::cancel);
        this.welcomeView = new WelcomeView(open, presenter::openSample);
        this.missingFactsView = new MissingFactsView(presenter::answer);
        build();
    }

    private void build() {
        frame.setDefaultCloseOperation(WindowConstants.DISPOSE_ON_CLOSE);
        frame.setJMenuBar(menuBar());
        result.setName("result");
        result.setResizeWeight(1);
        result.setBorder(BorderFactory.createEmptyBorder());
        findingsView.setPreferredSize(new Dimension(Look.digits(findingsView, FINDINGS_DIGITS), 0));
        findingsView.setMinimumSize(new Dimension(Look.px(280), 0));
        chartView.setMinimumSize(new Dimension(Look.px(260), 0));
        content.add(welcomeView, Welcome.class.getName());
        content.add(missingFactsView, Asking.class.getName());
        content.add(result, Result.class.getName());
        JPanel centre = new JPanel(new BorderLayout());
        centre.add(messageBar, BorderLayout.NORTH);
        centre.add(content, BorderLayout.CENTER);
        frame.getContentPane().add(toolBar, BorderLayout.NORTH);
        frame.getContentPane().add(centre, BorderLayout.CENTER);
        frame.getContentPane().add(statusBar, BorderLayout.SOUTH);
        frame.setFocusTraversalPolicy(new PastWords());
        frame.getRootPane().setTransferHandler(new FileDrop(presenter::drop));
        frame.setMinimumSize(new Dimension(Look.px(LEAST_SIZE.width), Look.px(LEAST_SIZE.height)));
        frame.setSize(Look.px(USUAL_SIZE.width), Look.px(USUAL_SIZE.height));
        frame.setLocationRelativeTo(null);
        preferences.bounds().ifPresent(frame::setBounds);
        frame.addWindowListener(new WindowAdapter() {
            @Override
            public void windowClosing(WindowEvent event) {
                preferences.setBounds(frame.getBounds());
            }
        });
    }

    private JMenuBar menuBar() {
        JMenu file = new JMenu("File");
        file.setMnemonic('F');
        file.add(open);
        file.addSeparator();
        file.add(new QuitAction(this::close));
        JMenu view = new JMenu("View");
        view.setMnemonic('V');
        ButtonGroup group = new ButtonGroup();
        for (Appearance appearance : Appearance.values()) {
            JRadioButtonMenuItem item = new JRadioButtonMenuItem(new AppearanceAction(appearance, this::change));
            item.setName("appearance-" + appearance);
            item.setSelected(preferences.appearance() == appearance);
            group.add(item);
            view.add(item);
        }
        JMenuBar bar = new JMenuBar();
        bar.add(file);
        bar.add(view);
        return bar;
    }

    /** Makes the window visible. */
    void open() {
        presenter.start();
        frame.setVisible(true);
    }

    JFrame frame() {
        return frame;
    }

    WindowPresenter presenter() {
        return presenter;
    }

    private void close() {
        preferences.setBounds(frame.getBounds());
        frame.dispose();
    }

    private void change(Appearance appearance) {
        preferences.setAppearance(appearance);
        Look.change(appearance);
        // colours that parts took from the look are taken anew
        shown = null;
        show(presenter.state());
    }

    private void show(WindowState state) {
        frame.setTitle(state.title());
        toolBar.show(state);
        messageBar.show(state.message());
        statusBar.show(state.status(), state.waiting());
        if (state.content() != shown) {
            shown = state.content();
            showContent(state.content());
        }
    }

    private void showContent(Content next) {
        if (next instanceof Welcome welcome) {
            welcomeView.show(welcome);
        } else if (next instanceof Asking asking) {
            missingFactsView.show(asking.question());
        } else if (next instanceof Result something) {
            chartView.show(
                    something.assessment(), something.findings().headline().large());
            findingsView.show(something.findings());
        } else if (next instanceof Unusable unusable) {
            content.add(WelcomeView.unusable(unusable.coupon(), unusable.reason()), Unusable.class.getName());
        }
        cards.show(content, next.getClass().getName());
    }
}
