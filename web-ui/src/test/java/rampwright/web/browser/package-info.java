/**
 * Tests that drive the running page in a real browser. They run in the integration-test phase
 * ({@code *IT}) and use the Chromium of the machine; nothing is downloaded.
 */
package rampwright.web.browser;
