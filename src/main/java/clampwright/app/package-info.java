/** The program: start, window, menus, files, preferences, command line. */
package clampwright.app;
