/** What a lap says about traction, balance, stability, control, tyre work and plate heat. */
package rampwright.vehicle.balance;
