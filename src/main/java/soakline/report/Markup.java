package soakline.report;

/** Text that is already part of a page: made by the program, never from a file. */
record Markup(String text) {

    @Override
    public String toString() {
        return text;
    }
}
