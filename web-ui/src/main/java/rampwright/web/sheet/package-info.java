/** The Sheet area: what the crew builds from, on screen and as a PDF. */
package rampwright.web.sheet;
