/**
 * The look of the window: colours, fonts, light and dark. All of it stands in properties files; the
 * views ask by name. The only package that imports the look-and-feel library. Imports nothing of
 * the project.
 */
package loopwright.view.theme;
