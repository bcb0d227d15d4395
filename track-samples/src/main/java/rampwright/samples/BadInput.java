package rampwright.samples;

/**
 * A file that must be refused.
 *
 * @param path path below the samples, with forward slashes
 * @param message the message that it must give when it is named by this path
 */
public record BadInput(String path, String message) {}
