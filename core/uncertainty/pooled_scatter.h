// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <span>
#include <vector>

#include "core/uncertainty/type_a.h"

namespace dampwright {

/// What one averaged force says about its own scatter.
struct Scatter {
  double force = 0;     ///< N
  double cycles = 0;    ///< how many were averaged
  double u = 0;         ///< N, standard error of the mean from cycle to cycle; of one cycle: unused
  double noiseU = 0;    ///< N, the part that noise within the cycles explains
  double noiseDof = 0;  ///< degrees of freedom of noiseU; 0: not known
};

/// Type A of each mean force, pooled over all of them.
///
/// The variance of a mean over n cycles is modelled as u² = noise² + (a² + (b·F)²)/n: noise of the
/// samples, which every block knows from its own samples; a scatter a that does not care for the
/// force (friction that sticks, a toggling zero); and one in percent of it. a² >= 0 and b² >= 0
/// come from all means of two cycles and more, by least squares on their variances, each weighted
/// by its own variance 2u⁴/ν of a normal scatter, until the weights stand still. So a force near
/// zero keeps the scatter that its neighbours show, and ten blocks of four cycles do not each need
/// Student's factor for three degrees of freedom.
/// Degrees of freedom: 2u⁴ over the variance of u² that the fit leaves. Without a mean of two
/// cycles only the noise is known.
/// Source: P. McCullagh, J. A. Nelder, Generalized linear models (1989), ch. 8 (gamma law, identity
/// link; from memory); degrees of freedom by Satterthwaite as in JCGM 100:2008 (GUM), G.4.1.
/// @return one for each, same order; u 0 and dof 0 where nothing is known
std::vector<TypeA> pooledScatter(std::span<const Scatter> means);

}  // namespace dampwright
