package whorl.sheet;

/** An opaque name of a cell, as its client gave it. */
public record CellId(String id) {}
