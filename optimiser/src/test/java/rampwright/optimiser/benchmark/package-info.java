/**
 * JMH benchmarks of the optimiser, compiled in every build and run by {@code .ci/benchmark}.
 * Results are kept with JDK, processor and commit.
 */
package rampwright.optimiser.benchmark;
