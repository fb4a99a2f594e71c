package org.foreseal.thermo;

import java.util.Optional;
import java.util.function.Function;

/**
 * An estimated value, or the reason in plain words why there is none. A missing estimate is never a
 * zero.
 *
 * @param <T> what is estimated
 */
public sealed interface Estimate<T> {
  /**
   * An estimate that could be made.
   *
   * @param estimated the value
   * @param <T> what is estimated
   */
  record Made<T>(T estimated) implements Estimate<T> {}

  /**
   * No estimate.
   *
   * @param why the reason in plain words, without a full stop
   * @param <T> what was asked for
   */
  record NotMade<T>(String why) implements Estimate<T> {}

  /** The value, if there is one. */
  default Optional<T> value() {
    return this instanceof Made<T> made ? Optional.of(made.estimated()) : Optional.empty();
  }

  /** Why there is no value, if there is none. */
  default Optional<String> reason() {
    return this instanceof NotMade<T> not ? Optional.of(not.why()) : Optional.empty();
  }

  /** The same outcome with the value turned into another. */
  default <R> Estimate<R> map(Function<? super T, ? extends R> change) {
    if (this instanceof Made<T> made) {
      return new Made<>(change.apply(made.estimated()));
    }
    return new NotMade<>(((NotMade<T>) this).why());
  }

  /** An estimate that could be made. */
  static <T> Estimate<T> of(T value) {
    return new Made<>(value);
  }

  /** No estimate, and why. */
  static <T> Estimate<T> none(String reason) {
    return new NotMade<>(reason);
  }
}
