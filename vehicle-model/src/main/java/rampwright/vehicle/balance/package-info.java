/**
 * What a lap says about traction, balance, stability, control, tyre work and plate heat.
 *
 * <p>Units and signs as in {@link rampwright.vehicle}. Understeer angles are positive for
 * understeer in either direction of turn, differential yaw moments are positive when they turn the
 * car out of the corner, time gaps are positive where the other lap loses. Knows laps, trims and
 * everything below them; changes none of it.
 */
package rampwright.vehicle.balance;
