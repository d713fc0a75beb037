package soakline;

/** Opens the window. */
final class WindowStarter {

    private WindowStarter() {}

    static void start() {
        // the window takes its place here when its room is built
    }
}
