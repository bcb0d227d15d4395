/** Small parts that several areas of the page share: numbers with units, notices, waiting. */
package rampwright.web.widget;
