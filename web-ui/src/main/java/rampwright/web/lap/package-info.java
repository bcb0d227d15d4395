/** The Lap area: the lap of a setting, corner by corner and phase by phase, and its traces. */
package rampwright.web.lap;
