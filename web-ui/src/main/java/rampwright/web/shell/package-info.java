/** The frame around every area: the name, the way through the job, light or dark. */
package rampwright.web.shell;
