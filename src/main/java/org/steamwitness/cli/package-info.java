/** Arguments and text: asks the use cases and shows what they give. It computes nothing. */
package org.steamwitness.cli;
