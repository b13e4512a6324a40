/**
 * How long a cold run takes and how much memory, beside the JDK's own two ways of running the same Java: {@link
 * sill.tests.benchmark.ColdRunBenchmark}, run by {@code mvn -B -Pbenchmark verify -DskipTests}. Nothing here judges a time
 * in the normal tests; those only see that the benchmark works.
 */
package sill.tests.benchmark;
