/**
 * Columns of samples on one time base, in SI units, and the one walk over what a straight line may join. A missing
 * sample is NaN inside a column; only the walk and the measures of this package meet it.
 */
package org.steamwitness.trace;
