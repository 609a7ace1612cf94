package whorl.report;

import java.util.List;

/** A line of a cell. */
record Line(List<Piece> pieces) {
  /** Copies the pieces. */
  Line {
    pieces = List.copyOf(pieces);
  }

  static Line of(Piece... pieces) {
    return new Line(List.of(pieces));
  }
}
