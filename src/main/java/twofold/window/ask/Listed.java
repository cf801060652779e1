package twofold.window.ask;

import twofold.cavity.Cavity;

/**
 * One thing of a list, where it stands.
 *
 * @param document number of the open document
 * @param cavity the solved design
 * @param index in its list
 * @param item the thing
 * @param <T> a requirement, lever or tolerance
 */
record Listed<T>(int document, Cavity cavity, int index, T item) {}
