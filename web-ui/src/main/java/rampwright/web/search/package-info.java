/**
 * The Search area: jobs that search a parts kit, which outlive the pages that watch them, and the
 * page that starts, watches, ends and reopens them.
 */
package rampwright.web.search;
