package org.foreseal.quantity;

/**
 * Input the user can mend: says what is wrong and where, points at it, and says what to do. The
 * command line turns it into a message and exit code 3; nothing else catches it.
 */
public final class BadInputException extends RuntimeException {
  private static final int LONGEST_EXCERPT = 76;

  private final Place place;
  private final String hint;

  /**
   * A complaint about one place.
   *
   * @param place where it is
   * @param problem what is wrong, without a full stop
   * @param hint what to do about it
   */
  public BadInputException(Place place, String problem, String hint) {
    super(problem);
    this.place = place;
    this.hint = hint;
  }

  /** Where the trouble is. */
  public Place place() {
    return place;
  }

  /** What to do about it. */
  public String hint() {
    return hint;
  }

  /**
   * The complaint as shown to the user: place and problem, the line with a caret below it, the
   * hint.
   */
  public String report() {
    StringBuilder text =
        new StringBuilder(place.label()).append(": ").append(getMessage()).append('\n');
    if (!place.text().isBlank()) {
      appendExcerpt(text);
    }
    return text.append("  hint: ").append(hint).toString();
  }

  private void appendExcerpt(StringBuilder text) {
    int caret = Math.max(0, Math.min(place.column() - 1, place.text().length()));
    int from =
        Math.max(0, Math.min(caret - LONGEST_EXCERPT / 2, place.text().length() - LONGEST_EXCERPT));
    int to = Math.min(place.text().length(), from + LONGEST_EXCERPT);
    String shown = place.text().substring(from, to).replaceAll("\\p{Cntrl}", " ");
    text.append("  ").append(shown).append('\n');
    if (place.column() > 0) {
      text.append("  ").append(" ".repeat(caret - from)).append("^\n");
    }
  }
}
