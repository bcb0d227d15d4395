package rampwright.vehicle.circuit.survey;

/** Parts of a file's name. */
final class FileName {
  private FileName() {}

  /** Returns the name without folders and without its ending. */
  static String stem(String file) {
    String last = file.substring(Math.max(file.lastIndexOf('/'), file.lastIndexOf('\\')) + 1);
    int dot = last.lastIndexOf('.');
    return dot > 0 ? last.substring(0, dot) : last;
  }
}
