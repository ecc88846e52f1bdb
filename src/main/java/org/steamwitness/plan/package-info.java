/**
 * Plan and run sheet as people write them, their check with line and column of each mistake, and their binding to one
 * trace, below which there are no names, no degC and no defaults.
 */
package org.steamwitness.plan;
