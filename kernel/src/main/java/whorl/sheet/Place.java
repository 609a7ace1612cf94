package whorl.sheet;

/**
 * Where a statement stands.
 *
 * @param cell its cell
 * @param index position of the statement within its cell, from 0
 * @param line line within the cell, from 1
 */
public record Place(CellId cell, int index, int line) {}
