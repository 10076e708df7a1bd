# Tables of any size, trends and pairs by R's stats package: fisher.test, chisq.test and loglin;
# exact trends by listing every table; mcnemar.test, binom.test, prop.test and uniroot for pairs.
# Run from the repository's root: Rscript tests/reference-values/scripts/tables-and-pairs.R [output folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20251204)

numbers <- function(x) array_of(number(unname(x)))
rows_of <- function(m) array_of(apply(m, 1, numbers))
root <- function(f, range) uniroot(f, range, tol = 1e-15, maxiter = 10000)$root

exact_table_case <- function(m) {
  object(field("kind", text("exactTable")), field("counts", rows_of(m)),
    field("fisher", number(fisher.test(m, workspace = 2e7)$p.value)))
}

table_case <- function(m) {
  chi <- suppressWarnings(chisq.test(m, correct = FALSE))
  g <- loglin(m, list(1, 2), print = FALSE, eps = 1e-12, iter = 50)
  v <- sqrt(unname(chi$statistic) / (sum(m) * (min(dim(m)) - 1)))
  object(field("kind", text("table")), field("counts", rows_of(m)),
    field("likelihoodRatio", numbers(c(g$lrt, g$df, pchisq(g$lrt, g$df, lower.tail = FALSE)))),
    field("residuals", rows_of(chi$stdres)), field("cramersV", number(v)))
}

# Every way to spread the events over the groups; scores are whole numbers.
exact_trend_case <- function(events, totals, scores) {
  m <- sum(events)
  ways <- as.matrix(expand.grid(lapply(totals, function(n) 0:min(n, m))))
  ways <- ways[rowSums(ways) == m, , drop = FALSE]
  weights <- exp(rowSums(sapply(seq_along(totals), function(i) lchoose(totals[i], ways[, i]))) -
    lchoose(sum(totals), m))
  distance <- function(x) abs(sum(totals) * (x %*% scores) - m * sum(totals * scores))
  far <- distance(ways) >= as.vector(distance(rbind(events)))
  people <- rep(scores, totals)
  sick <- unlist(lapply(seq_along(totals), function(i) rep(1:0, c(events[i], totals[i] - events[i]))))
  linear <- (length(people) - 1) * cor(people, sick)^2
  trend <- suppressWarnings(prop.trend.test(events, totals, scores))
  object(field("kind", text("trend")), field("events", numbers(events)),
    field("totals", numbers(totals)), field("scores", numbers(scores)),
    field("exactTrend", number(sum(weights[far]) / sum(weights))),
    field("linearByLinear", numbers(c(linear, pchisq(linear, 1, lower.tail = FALSE)))),
    field("cochranArmitage", numbers(c(trend$statistic, trend$p.value))))
}

random_trend <- function(totals, scores) {
  k <- length(totals)
  events <- rbinom(k, totals, plogis(-0.8 + 0.5 * seq_len(k) * runif(1, -0.5, 1)))
  exact_trend_case(pmax(events, c(1, rep(0, k - 1))), totals, scores)
}

wilson <- function(x, n, conf) suppressWarnings(prop.test(x, n, conf.level = conf, correct = FALSE))$conf.int
odds <- function(p) p / (1 - p)

mid_p <- function(b, n, tail) {
  below <- function(p) pbinom(b, n, p) - dbinom(b, n, p) / 2
  c(if (b == 0) 0 else root(function(p) below(p) - (1 - tail), c(0, 1)),
    root(function(p) below(p) - tail, c(0, 1)))
}

newcombe <- function(t, conf) {
  n <- sum(t)
  x <- c(t[1] + t[2], t[1] + t[3])
  p <- x / n
  one <- wilson(x[1], n, conf)
  other <- wilson(x[2], n, conf)
  spread <- sqrt(prod(x) * prod(n - x))
  top <- t[1] * t[4] - t[2] * t[3]
  phi <- if (spread == 0) 0 else (if (top > 0) max(0, top - n / 2) else top) / spread
  part <- function(u, v) sqrt(u^2 - 2 * phi * u * v + v^2)
  p[1] - p[2] + c(-part(p[1] - one[1], other[2] - p[2]), part(one[2] - p[1], p[2] - other[1]))
}

# The share of second-only pairs under a fixed difference, from the slope of the likelihood.
tango <- function(t, conf) {
  n <- sum(t)
  b <- t[2]
  c0 <- t[3]
  score <- function(d) {
    slope <- function(q) b / (q + d) + c0 / q - 2 * (n - b - c0) / (1 - 2 * q - d)
    ends <- c(max(0, -d), (1 - d) / 2)
    width <- diff(ends)
    q <- root(slope, ends + c(1e-14, -1e-14) * width)
    (b - c0 - n * d) / sqrt(n * (2 * q + d * (1 - d)))
  }
  z <- qnorm(1 - (1 - conf) / 2)
  d <- (b - c0) / n
  c(root(function(x) score(x) - z, c(-1 + 1e-9, d)), root(function(x) score(x) + z, c(d, 1 - 1e-9)))
}

pairs_case <- function(t, conf) {
  b <- t[2]
  n <- t[2] + t[3]
  plain <- mcnemar.test(matrix(t, 2, byrow = TRUE), correct = FALSE)
  exact <- binom.test(b, n)$p.value
  observed <- dbinom(b, n, 0.5)
  object(field("kind", text("pairs")), field("counts", numbers(t)), field("level", number(conf)),
    field("mcnemar", numbers(c(plain$statistic, plain$p.value))),
    field("mcnemarExact", number(exact)),
    field("mcnemarMidP", number(exact - if (2 * b == n) observed / 2 else observed)),
    field("newcombePaired", numbers(newcombe(t, conf))), field("tango", numbers(tango(t, conf))),
    field("matchedExact", numbers(odds(binom.test(b, n, conf.level = conf)$conf.int))),
    field("matchedMidP", numbers(odds(mid_p(b, n, (1 - conf) / 2)))),
    field("matchedWilson", numbers(odds(wilson(b, n, conf)))))
}

table_of <- function(...) matrix(c(...), ncol = 2)
satisfaction <- matrix(c(1, 2, 1, 0, 3, 3, 6, 1, 10, 10, 14, 9, 6, 7, 12, 11), 4)
random_table <- function(r, k, mean) matrix(rpois(r * k, mean) + rbinom(r * k, 1, 0.3), r)
level_of <- function(i) c(0.95, 0.9, 0.99)[1 + i %% 3]
random_pairs <- function(i) {
  t <- as.vector(rmultinom(1, round(exp(runif(1, log(12), log(900)))), c(3, 2, 1.5, 4)))
  pmax(t, c(1, 1, 1, 1))
}

cases <- c(
  lapply(list(satisfaction, table_of(3, 1, 1, 3), table_of(8, 10, 11, 22, 6, 53, 48, 100, 102, 129),
    table_of(83, 90, 129, 70, 3, 3, 7, 12), table_of(10, 10, 10, 10, 10, 10),
    diag(3) * 4, matrix(c(2, 0, 0, 2, 0, 2, 1, 1, 0, 0, 2, 1), 3)), exact_table_case),
  lapply(1:8, function(i) exact_table_case(random_table(2 + i %% 3, 3 + i %% 3, 3) + 1)),
  lapply(list(satisfaction + 1, matrix(c(762, 484, 327, 239, 468, 477), 2)), table_case),
  lapply(1:4, function(i) table_case(random_table(2 + i, 6 - i, 12 * i) + 1)),
  list(exact_trend_case(c(83, 90, 129, 70) - c(80, 87, 122, 58), c(6, 6, 14, 24), 1:4),
    random_trend(c(12, 15, 9), 1:3), random_trend(c(10, 8, 12, 9), 1:4),
    random_trend(c(10, 10, 10), c(0, 1, 3)), random_trend(c(7, 9, 6, 8), c(0, 1, 3, 10)),
    random_trend(c(20, 5, 9), c(2, 1, 3)), exact_trend_case(c(3, 1), c(4, 4), 0:1)),
  list(pairs_case(c(59, 6, 16, 80), 0.95), pairs_case(c(1, 1, 7, 12), 0.95),
    pairs_case(c(20, 12, 2, 16), 0.95), pairs_case(c(794, 150, 86, 570), 0.95),
    pairs_case(c(3, 4, 4, 2), 0.95)),
  lapply(1:10, function(i) pairs_case(random_pairs(i), level_of(i))))

write_lines(file.path(folder, "tables-and-pairs.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/tables-and-pairs.R"))), unlist(cases))
