/**
 * The web page: one package per area of the job, each holding its views, plus storage and charts.
 *
 * <p>Knows the optimiser and, through it, the vehicle model and the samples.
 */
package rampwright.web;
