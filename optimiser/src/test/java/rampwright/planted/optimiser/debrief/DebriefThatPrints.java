package rampwright.planted.optimiser.debrief;

/** Prints on purpose. */
public final class DebriefThatPrints {
  void print() {
    System.out.println("printed");
  }
}
