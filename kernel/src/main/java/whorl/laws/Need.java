package whorl.laws;

/** What happens where an argument is left out. */
public sealed interface Need {
  /** It must be given. */
  record Required() implements Need {}

  /**
   * It may be left out.
   *
   * @param otherwise what then is taken, in words; empty where the explanation says it
   */
  record Optional(String otherwise) implements Need {}

  /**
   * Exactly one of a group must be given.
   *
   * @param group the same for all of the group
   */
  record OneOf(String group) implements Need {}

  /**
   * It may be left out where another argument is known to be about something, or to be that of a
   * body or a force.
   *
   * @param of the other parameter
   * @param supply what is taken from there
   * @param demanded whether it must be given where it is not known
   */
  record Known(String of, Supply supply, boolean demanded) implements Need {
    /** One that must be given where it is not known. */
    public Known(String of, Supply supply) {
      this(of, supply, true);
    }
  }

  /** What can be taken from where a quantity comes from. */
  enum Supply {
    /** The point or axis that it is taken about. */
    PLACE,
    /** The mass of the body that it is of. */
    MASS,
    /** The centre of mass of the body that it is of. */
    CENTRE,
    /** The force that it is the moment of. */
    FORCE,
    /** The momentum of the matter that it is of, which nothing tells. */
    MOMENTUM
  }
}
