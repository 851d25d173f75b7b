package gapwright.study.leakage;

import java.util.List;

import gapwright.physics.leakage.WindowPath;

/**
 * Two legs of the core that face one another across a window.
 *
 * @param first        ids of the drawn legs one of them is made of
 * @param second       ids of the other's
 * @param window       its sizes, and its permeance if each leg were at one potential
 * @param paths        that stand for it, none when there is a reason
 * @param reason       why no path is made; "" when there are paths
 * @param countedTwice ids of gaps of a wound leg here whose method already reckons the field of this window
 */
public record FacingLegs(List<String> first, List<String> second, WindowPath window, List<LeakagePath> paths, String reason,
		List<String> countedTwice) {
}
