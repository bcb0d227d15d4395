package rampwright.vehicle.lap;

/**
 * The values of every {@link Channel} at every station of a lap, in one block of memory.
 *
 * <p>Written only while a lap is being solved; read-only afterwards.
 */
public final class Trace {
  private static final int CHANNELS = Channel.values().length;

  private final int stations;
  private final double[] values;

  Trace(int stations) {
    this.stations = stations;
    this.values = new double[stations * CHANNELS];
  }

  /** Returns the number of stations. */
  public int stations() {
    return stations;
  }

  /** Returns the value of a channel, in the channel's unit, at a station (0 is the start line). */
  public double get(Channel channel, int station) {
    return values[station * CHANNELS + channel.ordinal()];
  }

  /** Returns a copy of one channel over all stations. */
  public double[] column(Channel channel) {
    double[] column = new double[stations];
    for (int i = 0; i < stations; i++) {
      column[i] = get(channel, i);
    }
    return column;
  }

  /** Sets a channel of a block by the block's first channel and the place within it. */
  void set(Channel first, int offset, int station, double value) {
    values[station * CHANNELS + first.ordinal() + offset] = value;
  }

  void set(Channel channel, int station, double value) {
    values[station * CHANNELS + channel.ordinal()] = value;
  }
}
