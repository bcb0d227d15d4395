/** Rules for numbers that come from outside, and the one form in which a broken rule is told. */
package rampwright.vehicle.input;
