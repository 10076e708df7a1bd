# Stratified tables (mantelhaen.test; inverse-variance Q as the residual sum of squares of a
# weighted linear model), trends (prop.trend.test) and tables of any size (chisq.test) by R's stats
# package.
# Run from the repository's root: Rscript tests/reference-values/scripts/strata-and-trends.R
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20250612)

pair <- function(x) array_of(number(x))
random_strata <- function(k) {
  t(sapply(seq_len(k), function(i) {
    n <- round(exp(runif(2, log(8), log(600))))
    base <- runif(1, 0.1, 0.7)
    x <- pmin(n - 1, pmax(1, rbinom(2, n, c(min(0.95, base * 1.3), base))))
    c(x[1], n[1], x[2], n[2])
  }))
}

weighted_q <- function(y, variance) {
  fit <- lm(y ~ 1, weights = 1 / variance)
  q <- sum(weights(fit) * residuals(fit)^2)
  c(q, pchisq(q, length(y) - 1, lower.tail = FALSE))
}

stratified_case <- function(s) {
  p1 <- s[, 1] / s[, 2]
  p0 <- s[, 3] / s[, 4]
  cube <- array(apply(s, 1, function(t) c(t[1], t[3], t[2] - t[1], t[4] - t[3])),
    c(2, 2, nrow(s)))
  plain <- mantelhaen.test(cube, correct = FALSE)
  difference <- weighted_q(p1 - p0, p1 * (1 - p1) / s[, 2] + p0 * (1 - p0) / s[, 4])
  ratio <- weighted_q(log(p1 / p0), (1 - p1) / s[, 1] + (1 - p0) / s[, 3])
  object(field("kind", text("strata")),
    field("strata", array_of(apply(s, 1, pair))),
    field("oddsRatio", pair(c(plain$estimate, plain$conf.int))),
    field("cochranMantelHaenszel", pair(c(plain$statistic, plain$p.value))),
    field("riskDifferenceQ", pair(difference)), field("riskRatioQ", pair(ratio)))
}

trend_case <- function(k, scores) {
  n <- round(exp(runif(k, log(10), log(3000))))
  x <- rbinom(k, n, plogis(-1.5 + 0.35 * seq_len(k) * runif(1, -1, 1)))
  result <- prop.trend.test(x, n, scores)
  object(field("kind", text("trend")), field("events", pair(x)), field("totals", pair(n)),
    field("scores", pair(scores)), field("trend", pair(c(result$statistic, result$p.value))))
}

table_case <- function(rows, columns) {
  m <- matrix(rpois(rows * columns, exp(runif(1, 1, 5))), rows) + 1
  result <- suppressWarnings(chisq.test(m, correct = FALSE))
  object(field("kind", text("table")), field("counts", array_of(apply(m, 1, pair))),
    field("pearson", pair(c(result$statistic, result$parameter, result$p.value))))
}

cases <- c(lapply(c(2, 2, 3, 4, 6, 10, 20), function(k) stratified_case(random_strata(k))),
  lapply(3:9, function(k) trend_case(k, seq_len(k))),
  list(trend_case(5, c(0, 0.5, 1.5, 4, 7)), trend_case(4, c(-1, 0, 3, 10))),
  list(table_case(3, 2), table_case(6, 2), table_case(4, 4), table_case(20, 2)))

write_lines(file.path(folder, "strata-and-trends.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/strata-and-trends.R"))), unlist(cases))
