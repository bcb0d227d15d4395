/** The Compare area: two to four settings side by side, by corner, by cause and on the map. */
package rampwright.web.compare;
