package rampwright.web.store;

import java.util.Optional;

/**
 * An event in a list.
 *
 * @param id place in the store
 * @param name its name
 * @param sample path of the sample it was made from
 */
public record EventName(long id, String name, Optional<String> sample) {}
