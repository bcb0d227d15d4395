/**
 * The desk: computes laps away from the pages that ask for them, and keeps the last ones. Knows no
 * component and no area of the page.
 */
package rampwright.web.work;
