package soakline;

/** Where the program starts and where its parts are put together. */
public final class Main {

    private Main() {}

    public static void main(String[] args) {
        System.exit(args.length);
    }
}
