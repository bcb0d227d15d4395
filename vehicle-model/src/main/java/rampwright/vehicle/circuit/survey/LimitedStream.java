package rampwright.vehicle.circuit.survey;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Locale;
import rampwright.vehicle.input.InvalidInput;

/**
 * A stream that refuses to go on past a size, so that a huge file costs neither memory nor time.
 */
final class LimitedStream extends FilterInputStream {
  /** Largest file that is read unless a caller says otherwise (bytes). */
  static final long LARGEST_FILE = 100_000_000;

  private final String file;
  private final long most;
  private long read;

  LimitedStream(String file, InputStream in, long most) {
    super(in);
    this.file = file;
    this.most = most;
  }

  @Override
  public int read() throws IOException {
    int value = super.read();
    count(value < 0 ? 0 : 1);
    return value;
  }

  @Override
  public int read(byte[] buffer, int offset, int length) throws IOException {
    int count = super.read(buffer, offset, length);
    count(Math.max(0, count));
    return count;
  }

  @Override
  public boolean markSupported() {
    return false;
  }

  private void count(int more) {
    read += more;
    if (read > most) {
      throw tooLarge(file, "more than " + megabytes(most), most);
    }
  }

  /** Returns the error for a file of a size. */
  static InvalidInput tooLarge(String file, String size, long most) {
    return InvalidInput.of(
            "size of the file",
            size,
            "at most " + megabytes(most),
            "export one lap and only the columns that are needed")
        .at(file);
  }

  static String megabytes(long bytes) {
    return String.format(Locale.ROOT, "%.0f MB", bytes / 1e6);
  }
}
