/**
 * Water and steam as IAPWS-IF97 (IAPWS R7-97(2012)) describes them: pure functions on SI doubles, one small class a
 * formula. This package imports nothing of the program.
 *
 * <p>{@link org.steamwitness.steam.Saturation}, {@link org.steamwitness.steam.Region1} and {@link
 * org.steamwitness.steam.Region2} are the release. {@link org.steamwitness.steam.Saturated}, {@link
 * org.steamwitness.steam.WetSteam} and {@link org.steamwitness.steam.Superheated} find states from other pairs than
 * temperature and pressure. {@link org.steamwitness.steam.SteamAir} adds air by Dalton's law, {@link
 * org.steamwitness.steam.SealedVessel} a rigid vessel that holds both.
 */
package org.steamwitness.steam;
