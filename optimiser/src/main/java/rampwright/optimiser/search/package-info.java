/**
 * The search for the best setting that the parts kit holds: what can be built, what a setting costs
 * in lap time and against the limits, the genetic search with its check by full enumeration, and
 * which settings drive alike.
 *
 * <p>Times in seconds, all else SI. Knows event, kit and vehicle model, and is with the studies the
 * only place that knows the search library.
 */
package rampwright.optimiser.search;
