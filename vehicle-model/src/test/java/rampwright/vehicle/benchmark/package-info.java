/**
 * JMH benchmarks of the vehicle model, compiled in every build and run by {@code .ci/benchmark}.
 * Results are kept with JDK, processor and commit.
 */
package rampwright.vehicle.benchmark;
