# Exact and conditional methods of fourfold tables, recomputed by base R. Limits are roots of sums
# of dhyper and dbinom, found here to 1e-14: fisher.test stops at 1e-4 of an inverse scale and errs
# where a limit is large. The exact unconditional methods are brute force: every table, a fine grid
# of the unknown risk, refined; statistics compared as whole numbers where they are rational.
# Run from the repository's root: Rscript tests/reference-values/scripts/exact.R [output folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20250613)

pair <- function(x) array_of(number(x))
counts_of <- function(t) c(field("index", pair(t[1:2])), field("reference", pair(t[3:4])))

# Where an increasing function of a real number passes zero, by bisection to the last bits.
root <- function(f, low, high) {
  for (step in 1:200) {
    middle <- (low + high) / 2
    if (middle == low || middle == high) break
    if (f(middle) > 0) high <- middle else low <- middle
  }
  middle
}

# Conditional distribution of the index events -------------------------------------------------

conditional <- function(t) {
  drawn <- t[1] + t[3]
  support <- max(0, drawn - t[4]):min(t[2], drawn)
  logs <- dhyper(support, t[2], t[4], drawn, log = TRUE)
  at <- function(ratio) {
    w <- logs + support * ratio
    w <- exp(w - max(w))
    w / sum(w)
  }
  list(support = support, at = at)
}

conditional_limits <- function(t, level, own) {
  d <- conditional(t)
  tail <- (1 - level) / 2
  upper_tail <- function(r) sum(d$at(r) * ((d$support > t[1]) + own * (d$support == t[1])))
  lower_tail <- function(r) sum(d$at(r) * ((d$support < t[1]) + own * (d$support == t[1])))
  lower <- if (t[1] == min(d$support)) 0 else exp(root(function(r) upper_tail(r) - tail, -60, 60))
  upper <- if (t[1] == max(d$support)) NA else exp(root(function(r) tail - lower_tail(r), -60, 60))
  c(lower, upper)
}

conditional_estimate <- function(t) {
  d <- conditional(t)
  if (t[1] == min(d$support)) return(0)
  if (t[1] == max(d$support)) return(NA)
  exp(root(function(r) sum(d$at(r) * (d$support - t[1])), -60, 60))
}

# Twice the log likelihood ratio, by the deviation that all four cells share.
likelihood_ratio <- function(cells) {
  total <- sum(cells)
  groups <- c(cells[1] + cells[2], cells[3] + cells[4])
  outcomes <- c(cells[1] + cells[3], cells[2] + cells[4])
  expected <- as.vector(t(outer(groups, outcomes))) / total
  2 * sum(ifelse(cells == 0, 0, cells * log(cells / expected)))
}

conditional_case <- function(t, level) {
  cells <- c(t[1], t[2] - t[1], t[3], t[4] - t[3])
  m <- matrix(cells, 2, byrow = TRUE)
  corrected <- suppressWarnings(chisq.test(m, correct = TRUE))
  g <- likelihood_ratio(cells)
  half <- dhyper(t[1], t[2], t[4], t[1] + t[3]) / 2
  object(field("kind", text("conditional")), counts_of(t), field("level", number(level)),
    field("estimate", number(conditional_estimate(t))),
    field("exact", pair(conditional_limits(t, level, 1))),
    field("midP", pair(conditional_limits(t, level, 0.5))),
    field("yates", pair(c(corrected$statistic, corrected$p.value))),
    field("likelihoodRatio", pair(c(g, pchisq(g, 1, lower.tail = FALSE)))),
    field("fisherMidP", number(fisher.test(m)$p.value - half)))
}

random_table <- function(largest) {
  n <- round(exp(runif(2, log(3), log(largest))))
  x <- rbinom(2, n, c(rbeta(1, 0.8, 1.2), rbeta(1, 0.8, 1.2)))
  if (sum(x) == 0) x[1] <- 1
  if (sum(x) == sum(n)) x[2] <- n[2] - 1
  c(x[1], n[1], x[2], n[2])
}
conditional_tables <- c(list(c(3, 4, 1, 4), c(3, 5, 5, 10000), c(7, 34, 1, 34), c(0, 16, 15, 72),
  c(5, 5, 0, 9), c(5, 12, 0, 9), c(20, 1000000, 60, 1000000), c(300, 500000, 250, 500000)),
  lapply(1:24, function(i) random_table(if (i %% 6 == 0) 20000 else 300)))

# Exact unconditional tests: the largest probability of extreme tables over a common risk --------

chances <- sin(seq(0, pi / 2, length.out = 2001))^2
largest_probability <- function(extreme, n1, n0) {
  probability <- function(p) {
    sum(outer(dbinom(0:n1, n1, p), dbinom(0:n0, n0, p)) * extreme)
  }
  rows <- sapply(0:n1, function(i) dbinom(i, n1, chances))
  columns <- sapply(0:n0, function(j) dbinom(j, n0, chances))
  values <- rowSums((rows %*% extreme) * columns)
  refined(values, chances, probability)
}

# The maximum of a grid's values, refined around its three highest peaks.
refined <- function(values, places, probability) {
  inner <- 2:(length(values) - 1)
  peaks <- inner[values[inner] >= values[inner - 1] & values[inner] >= values[inner + 1]]
  best <- head(peaks[order(-values[peaks])], 3)
  tops <- sapply(best, function(k)
    optimize(probability, places[c(k - 1, k + 1)], maximum = TRUE, tol = 1e-9)$objective)
  max(c(values, unlist(tops)))
}

barnard_p <- function(t) {
  i <- outer(0:t[2], rep(1, t[4] + 1))
  j <- outer(rep(1, t[2] + 1), 0:t[4])
  apart <- (i * t[4] - j * t[2])^2
  pool <- (i + j) * (t[2] + t[4] - i - j)
  observed <- c((t[1] * t[4] - t[3] * t[2])^2, (t[1] + t[3]) * (t[2] + t[4] - t[1] - t[3]))
  extreme <- ifelse(pool == 0, observed[1] == 0, apart * observed[2] >= observed[1] * pool)
  largest_probability(extreme, t[2], t[4])
}

# Fisher's p as a fraction: numerator and denominator are whole numbers below 2^53.
fisher_fraction <- function(i, j, n1, n0) {
  drawn <- i + j
  support <- max(0, drawn - n0):min(n1, drawn)
  weights <- round(choose(n1, support) * choose(n0, drawn - support))
  own <- weights[support == i]
  c(sum(weights[weights <= own]), sum(weights))
}

boschloo_p <- function(t) {
  observed <- fisher_fraction(t[1], t[3], t[2], t[4])
  extreme <- outer(0:t[2], 0:t[4], Vectorize(function(i, j) {
    f <- fisher_fraction(i, j, t[2], t[4])
    f[1] * observed[2] <= observed[1] * f[2]
  }))
  largest_probability(extreme, t[2], t[4])
}

test_case <- function(t) {
  object(field("kind", text("unconditionalTest")), counts_of(t),
    field("barnard", number(barnard_p(t))), field("boschloo", number(boschloo_p(t))))
}
test_tables <- list(c(3, 4, 1, 4), c(7, 12, 1, 12), c(0, 5, 4, 9), c(10, 13, 2, 11), c(2, 6, 5, 7),
  c(5, 10, 5, 10), c(1, 8, 4, 6), c(8, 10, 1, 6), c(6, 14, 1, 11), c(12, 12, 3, 7))

# Exact unconditional intervals by the score statistic ------------------------------------------

# Constrained risks of the reference group for every table at once, by bisection.
constrained <- function(i, j, n1, n0, index_risk, least, most, slope) {
  low <- matrix(least, nrow(i), ncol(i))
  high <- matrix(most, nrow(i), ncol(i))
  for (step in 1:48) {
    middle <- (low + high) / 2
    up <- slope(middle) > 0
    low[up] <- middle[up]
    high[!up] <- middle[!up]
  }
  (low + high) / 2
}
share <- function(count, risk) ifelse(count == 0, 0, count / risk)

difference_scores <- function(i, j, n1, n0, d) {
  slope <- function(r) share(i, r + d) - share(n1 - i, 1 - r - d) + share(j, r) - share(n0 - j, 1 - r)
  r0 <- constrained(i, j, n1, n0, d, max(0, -d), min(1, 1 - d), slope)
  r1 <- r0 + d
  apart <- i / n1 - j / n0 - d
  ifelse(abs(apart) < 1e-14, 0, apart / sqrt(r1 * (1 - r1) / n1 + r0 * (1 - r0) / n0))
}

ratio_scores <- function(i, j, n1, n0, log_ratio) {
  ratio <- exp(log_ratio)
  slope <- function(r) share(i, r) - share(n1 - i, (1 - ratio * r) / ratio) + share(j, r) -
    share(n0 - j, 1 - r)
  r0 <- constrained(i, j, n1, n0, ratio, 0, min(1, 1 / ratio), slope)
  r1 <- ratio * r0
  apart <- i / n1 - ratio * j / n0
  spread <- sqrt(r1 * (1 - r1) / n1 + ratio^2 * r0 * (1 - r0) / n0)
  ifelse(abs(apart) < 1e-14, 0, apart / spread)
}

difference_family <- list(scores = difference_scores,
  index_risk = function(r, d) pmin(1, pmax(0, r + d)),
  range = function(d) c(max(0, -d), min(1, 1 - d)))
ratio_family <- list(scores = ratio_scores,
  index_risk = function(r, log_ratio) pmin(1, r * exp(log_ratio)),
  range = function(log_ratio) c(0, min(1, exp(-log_ratio))))

unconditional_p <- function(t, family, tested, two_sided) {
  i <- outer(0:t[2], rep(1, t[4] + 1))
  j <- outer(rep(1, t[2] + 1), 0:t[4])
  scores <- family$scores(i, j, t[2], t[4], tested)
  own <- scores[t[1] + 1, t[3] + 1]
  slack <- 1e-9 * max(1, abs(own))
  extreme <- if (two_sided) abs(scores) >= abs(own) - slack else scores >= own - slack
  span <- family$range(tested)
  risks <- span[1] + (span[2] - span[1]) * sin(seq(0, pi / 2, length.out = 301))^2
  rows <- sapply(0:t[2], function(k) dbinom(k, t[2], family$index_risk(risks, tested)))
  columns <- sapply(0:t[4], function(k) dbinom(k, t[4], risks))
  values <- rowSums((rows %*% extreme) * columns)
  refined(values, risks, function(r) sum(extreme *
    outer(dbinom(0:t[2], t[2], family$index_risk(r, tested)), dbinom(0:t[4], t[4], r))))
}

# The outermost tested value that is not refused: a scan from outside in, then bisection.
lower_limit <- function(t, family, from, to, tail, two_sided) {
  accepted <- function(tested) unconditional_p(t, family, tested, two_sided) > tail
  places <- seq(from, to, length.out = 81)
  for (k in 2:80) {
    if (accepted(places[k])) {
      low <- places[k - 1]
      high <- places[k]
      for (step in 1:34) {
        middle <- (low + high) / 2
        if (accepted(middle)) high <- middle else low <- middle
      }
      # At no effect tables tie exactly; the slack of ties makes a limit there come out beside 0.
      return(if (abs(high) < 1e-8) 0 else high)
    }
  }
  to
}

turned <- function(t) t[c(3, 4, 1, 2)]
difference_limits <- function(t, level, two_sided) {
  tail <- if (two_sided) 1 - level else (1 - level) / 2
  lower <- function(u) {
    value <- u[1] / u[2] - u[3] / u[4]
    if (value <= -1) -1 else lower_limit(u, difference_family, -1, value, tail, two_sided)
  }
  c(lower(t), -lower(turned(t)))
}
ratio_limits <- function(t, level) {
  tail <- (1 - level) / 2
  lower <- function(u) {
    if (u[1] == 0) return(0)
    most <- if (u[3] == 0) log(4 * u[4] / tail) else log(u[1] / u[2] / (u[3] / u[4]))
    exp(lower_limit(u, ratio_family, log(tail / u[2]) - 1, most, tail, FALSE))
  }
  c(lower(t), 1 / lower(turned(t)))
}

unconditional_case <- function(t, level) {
  object(field("kind", text("unconditionalInterval")), counts_of(t), field("level", number(level)),
    field("chanZhang", pair(difference_limits(t, level, FALSE))),
    field("agrestiMin", pair(difference_limits(t, level, TRUE))),
    if (t[1] + t[3] > 0) field("ratio", pair(ifelse(is.finite(r <- ratio_limits(t, level)), r, NA))))
}
unconditional_tables <- list(c(3, 4, 1, 4), c(6, 7, 2, 7), c(0, 5, 3, 6), c(5, 5, 0, 6),
  c(2, 7, 2, 5), c(4, 8, 1, 3), c(0, 4, 0, 6))

# One group without events, and adjustments ------------------------------------------------------

zero_case <- function(n, level) {
  object(field("kind", text("zeroEvents")), field("total", number(n)), field("level", number(level)),
    field("upper", number(binom.test(0, n, alternative = "less", conf.level = level)$conf.int[2])))
}
adjusted_case <- function(p) {
  object(field("kind", text("adjusted")), field("pValues", pair(p)),
    field("holm", pair(p.adjust(p, "holm"))), field("hochberg", pair(p.adjust(p, "hochberg"))),
    field("benjaminiHochberg", pair(p.adjust(p, "BH"))),
    field("bonferroni", pair(p.adjust(p, "bonferroni"))))
}

levels <- c(0.95, 0.9, 0.99)
cases <- c(
  mapply(conditional_case, conditional_tables, levels[1 + seq_along(conditional_tables) %% 3]),
  sapply(test_tables, test_case),
  mapply(unconditional_case, unconditional_tables, levels[1 + seq_along(unconditional_tables) %% 2]),
  mapply(zero_case, c(1, 5, 30, 2500, 1e6), c(0.95, 0.95, 0.95, 0.99, 0.9)),
  sapply(list(c(0.01, 0.02, 0.03, 0.04), c(0.04, 0.001, 0.5, 0.03, 0.03, 1), c(0.2), c(0, 0.9, 0.9),
    round(runif(25)^3, 4)), adjusted_case))

write_lines(file.path(folder, "exact.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/exact.R")),
    field("quantities", array_of(text(c("riskDifference.chanZhang", "riskDifference.agrestiMin",
      "riskRatio.chanZhang", "oddsRatio.conditionalExact", "oddsRatio.conditionalMidP", "yates",
      "likelihoodRatio", "fisherMidP", "barnard", "boschloo"))))), cases)
