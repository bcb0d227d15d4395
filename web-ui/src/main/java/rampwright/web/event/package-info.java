/** The Event area: car, circuit, kit, conditions, limits and the setting in the car now. */
package rampwright.web.event;
