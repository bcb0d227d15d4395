/**
 * The setup sheet: what the crew builds, measures and signs. {@link
 * rampwright.optimiser.sheet.SetupSheet} holds its content in SI units; {@link
 * rampwright.optimiser.sheet.SheetPdf} sets it on one A4 page. Knows event, kit and search; nothing
 * here reads a clock, so that equal inputs give equal pages.
 */
package rampwright.optimiser.sheet;
