/** What both faces ask for, one class a use case: the only callers of clock and files. Nothing here prints. */
package org.steamwitness.run;
