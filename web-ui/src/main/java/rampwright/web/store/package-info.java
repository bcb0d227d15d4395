/**
 * What outlives a page: events and search runs, kept in one database as the plain text of their
 * files. Knows no component and no area of the page.
 */
package rampwright.web.store;
