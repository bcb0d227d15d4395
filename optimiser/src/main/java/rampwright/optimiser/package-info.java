/**
 * From a parts kit to a setting: search, studies, run plan, debrief, setup sheet and command line.
 *
 * <p>Knows the vehicle model and the samples; never the web page.
 */
package rampwright.optimiser;
