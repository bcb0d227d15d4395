package rampwright.planted.web.compare;

/** Keeps static state on purpose. */
public final class ViewWithStaticState {
  static int visits;

  private ViewWithStaticState() {}
}
