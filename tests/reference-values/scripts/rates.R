# Rates by R's stats package: poisson.test for one rate and the exact ratio, uniroot on pbinom for
# mid-p, prop.test for the score limits of the split, Poisson regression for Wald's ratio, a root of
# the constrained likelihood for the score difference, qgamma for standardised rates. Sums over
# strata after Greenland and Robins are written out anew.
# Run from the repository's root: Rscript tests/reference-values/scripts/rates.R [output folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20251201)

numbers <- function(x) array_of(number(unname(x)))
level_of <- function(i) c(0.95, 0.9, 0.99)[1 + i %% 3]

one_case <- function(events, time, conf) {
  limits <- poisson.test(events, time, conf.level = conf)$conf.int
  object(field("kind", text("rate")), field("count", numbers(c(events, time))),
    field("level", number(conf)), field("garwood", numbers(limits)))
}

precise_root <- function(f, lower, upper) uniroot(f, c(lower, upper), tol = 1e-15, maxiter = 10000)$root

mid_p_odds <- function(x, others, tail) {
  at <- function(t) {
    p <- plogis(t)
    pbinom(x - 1, x + others, p, lower.tail = FALSE) - dbinom(x, x + others, p) / 2 - tail
  }
  exp(precise_root(at, -40, 40))
}

# The likeliest pair of rates under a fixed difference, by maximising over the reference rate.
score_difference <- function(t, difference) {
  least <- max(0, -difference)
  slope <- function(r) {
    (if (t[1] > 0) t[1] / (r + difference) else 0) - t[2] + (if (t[3] > 0) t[3] / r else 0) - t[4]
  }
  scale <- max((t[1] + 1) / t[2], (t[3] + 1) / t[4]) + abs(difference)
  start <- least + 1e-13 * scale
  reference <- if (slope(start) <= 0) least else precise_root(slope, start, least + 20 * scale)
  variance <- (reference + difference) / t[2] + reference / t[4]
  (t[1] / t[2] - t[3] / t[4] - difference) / sqrt(variance)
}

score_limits <- function(t, z) {
  estimate <- t[1] / t[2] - t[3] / t[4]
  step <- 60 * ((t[1] + 1) / t[2] + (t[3] + 1) / t[4])
  small <- 1e-9 * step
  c(precise_root(function(d) score_difference(t, d) - z, estimate - step, estimate - small),
    precise_root(function(d) score_difference(t, d) + z, estimate + small, estimate + step))
}

pair_case <- function(t, conf) {
  z <- qnorm(1 - (1 - conf) / 2)
  tail <- (1 - conf) / 2
  events <- t[1] + t[3]
  with_reference <- t[3] > 0
  both <- t[1] > 0 && with_reference
  difference <- t[1] / t[2] - t[3] / t[4]
  spread <- z * sqrt(t[1] / t[2]^2 + t[3] / t[4]^2)
  ratio_of <- function(share) share / (1 - share) * t[4] / t[2]
  fit <- if (both) glm(c(t[1], t[3]) ~ c(1, 0) + offset(log(c(t[2], t[4]))), family = poisson,
    control = glm.control(epsilon = 1e-14, maxit = 100))
  split <- if (with_reference) suppressWarnings(prop.test(t[1], events, conf.level = conf,
    correct = FALSE))$conf.int
  exact <- if (with_reference) poisson.test(c(t[1], t[3]), c(t[2], t[4]), conf.level = conf)$conf.int
  object(field("kind", text("pair")), field("index", numbers(t[1:2])),
    field("reference", numbers(t[3:4])), field("level", number(conf)),
    if (events > 0) field("wald", numbers(c(difference - spread, difference + spread))),
    field("miettinenNurminen", numbers(score_limits(t, z))),
    if (both) field("waldLog", numbers(exp(confint.default(fit, level = conf)[2, ]))),
    if (with_reference) field("exactConditional", numbers(exact)),
    if (with_reference) field("score", numbers(ratio_of(split))),
    if (both) field("midPConditional", numbers(c(mid_p_odds(t[1], t[3], tail),
      1 / mid_p_odds(t[3], t[1], tail)) * t[4] / t[2])))
}

random_pair <- function(i) {
  time <- round(exp(runif(2, log(30), log(if (i %% 4 == 0) 3e6 else 5000))), 1)
  events <- rpois(2, exp(runif(2, log(0.4), log(if (i %% 3 == 0) 900 else 30))))
  c(events[1], time[1], events[2], time[2])
}

strata_case <- function(k) {
  s <- t(sapply(seq_len(k), function(i) {
    time <- round(exp(runif(2, log(100), log(20000))), 1)
    rate <- runif(1, 0.001, 0.02)
    c(rpois(1, rate * 1.6 * time[1]), time[1], rpois(1, rate * time[2]), time[2])
  }))
  all_time <- s[, 2] + s[, 4]
  numerator <- sum(s[, 1] * s[, 4] / all_time)
  denominator <- sum(s[, 3] * s[, 2] / all_time)
  ratio <- numerator / denominator
  spread <- sum((s[, 1] + s[, 3]) * s[, 2] * s[, 4] / all_time^2) / numerator / denominator
  weight <- s[, 2] * s[, 4] / all_time
  difference <- sum(weight * (s[, 1] / s[, 2] - s[, 3] / s[, 4])) / sum(weight)
  variance <- sum(weight^2 * (s[, 1] / s[, 2]^2 + s[, 3] / s[, 4]^2)) / sum(weight)^2
  z <- qnorm(0.975)
  object(field("kind", text("strata")), field("strata", array_of(apply(s, 1, numbers))),
    field("pooledRatio", numbers(ratio * exp(c(0, -1, 1) * z * sqrt(spread)))),
    field("pooledDifference", numbers(difference + c(0, -1, 1) * z * sqrt(variance))))
}

standardised_case <- function(events, time, weight, conf) {
  share <- weight / sum(weight)
  rate <- sum(share * events / time)
  variance <- sum(share^2 * events / time^2)
  most <- max((share / time)[share > 0])
  lower <- if (rate == 0) 0 else qgamma((1 - conf) / 2, rate^2 / variance, rate / variance)
  upper <- qgamma(1 - (1 - conf) / 2, (rate + most)^2 / (variance + most^2),
    (rate + most) / (variance + most^2))
  object(field("kind", text("standardised")), field("events", numbers(events)),
    field("times", numbers(time)), field("weights", numbers(weight)), field("level", number(conf)),
    field("fayFeuer", numbers(c(rate, lower, upper))))
}

random_standardised <- function(i) {
  k <- 3 + i %% 6
  time <- round(exp(runif(k, log(50), log(1e5))))
  standardised_case(rpois(k, time * exp(runif(k, log(1e-4), log(0.01)))), time,
    round(runif(k, 100, 20000)), level_of(i))
}

# Births by mother's age (rows) and birth order (columns), and those with the condition: Fleiss JL,
# Statistical Methods for Rates and Proportions, 2nd edition 1981, p. 249. Table I of Fay and Feuer
# (1997) standardises each birth order to the mean of the columns.
births <- matrix(c(230061, 329449, 114920, 39487, 14208, 3052, 72202, 326701, 208667, 83228, 28466,
  5375, 15050, 175702, 207081, 117300, 45026, 8660, 2293, 68800, 132424, 98301, 46075, 9834, 327,
  30666, 123419, 149919, 104088, 34392), 6)
with_condition <- matrix(c(107, 141, 60, 40, 39, 25, 25, 150, 110, 84, 82, 39, 3, 71, 114, 103, 108,
  75, 1, 26, 64, 89, 137, 96, 0, 8, 63, 112, 262, 295), 6)

shapes <- c(1, 1.37, 2, 5, 10.5, 42, 317.25, 5000, 250000)
tails <- c(1e-6, 0.0005, 0.005, 0.025, 0.1, 0.5, 0.9, 0.975, 0.9995)
gammas <- expand.grid(shape = shapes, p = tails)
gamma_case <- function(shape, p) {
  object(field("kind", text("gamma")), field("probability", number(p)),
    field("shape", number(shape)), field("quantile", number(qgamma(p, shape))),
    field("upperQuantile", number(qgamma(p, shape, lower.tail = FALSE))))
}

ones <- rbind(c(0, 5), c(1, 1000), c(2, 33.5), c(10, 2000), c(47, 86400), c(411, 786511),
  c(12345, 1e7))
fixed <- list(c(0, 120, 0, 80), c(0, 60, 4, 90), c(6, 60, 0, 90), c(1, 10, 1, 10),
  c(41, 28010, 15, 19017), c(10, 1000, 20, 1000), c(3, 1e7, 9, 2e7))
cases <- c(
  mapply(gamma_case, gammas$shape, gammas$p),
  sapply(seq_len(nrow(ones)), function(i) one_case(ones[i, 1], ones[i, 2], level_of(i))),
  mapply(function(t, i) pair_case(t, level_of(i)), c(fixed, lapply(seq_len(30), random_pair)),
    seq_len(37)),
  sapply(c(1, 2, 3, 5, 8, 20), strata_case),
  sapply(seq_len(5), function(i) standardised_case(with_condition[, i], births[, i],
    rowMeans(births), 0.95)),
  list(standardised_case(c(0, 0, 0), c(100, 250, 40), c(3, 2, 1), 0.95)),
  sapply(seq_len(10), random_standardised))

write_lines(file.path(folder, "rates.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/rates.R"))), unlist(cases))
