/**
 * Water and steam as IAPWS-IF97 (IAPWS R7-97(2012)) describes them: pure functions on SI doubles, one small class a
 * formula. This package imports nothing of the program.
 */
package org.steamwitness.steam;
