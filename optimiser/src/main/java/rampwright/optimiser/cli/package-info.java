/**
 * The command line: the same jobs as the web page, for scripts and for checking. One class per
 * command; {@code …Document} and {@code …Text} turn its answer into JSON and into tables. The only
 * package that prints or ends the process; may know every other package of the optimiser.
 */
package rampwright.optimiser.cli;
