package soakline.window.view;

/** Light or dark. */
enum Appearance {
    LIGHT,
    DARK
}
