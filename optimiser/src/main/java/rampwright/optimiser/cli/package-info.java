/** The command line: the same jobs as the web page, for scripts and for checking. */
package rampwright.optimiser.cli;
