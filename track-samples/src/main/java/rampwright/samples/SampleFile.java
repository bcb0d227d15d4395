package rampwright.samples;

/**
 * One sample.
 *
 * @param path path below the samples, with forward slashes
 * @param kind what it is: {@code circuit}, {@code logged lap}, {@code line}, {@code car}, {@code
 *     tyre}, {@code kit} or {@code event}
 * @param title a line for people
 */
public record SampleFile(String path, String kind, String title) {}
