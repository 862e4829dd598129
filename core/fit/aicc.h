// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace dampwright {

/// Akaike's information criterion corrected for few points, n·ln(rss/n) + 2K + 2K(K+1)/(n−K−1) with
/// K = parameters + 1 (the residual variance is one). The smaller is the better among models of the
/// same points. +inf where n <= K + 1, −inf for rss = 0.
/// Source: C. M. Hurvich, C.-L. Tsai, Biometrika 76 (1989) 297.
double aicc(double rss, int points, int parameters);

}  // namespace dampwright
