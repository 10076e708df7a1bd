# Methods over strata by R's stats package: mantelhaen.test (exact, and for tables of any size),
# binomial models for standardised risks and interaction, weighted linear models for Woolf's Q.
# mantelhaen.test finds exact limits to about 1e-4 only: its own are kept beside the roots of the
# same conditional distribution found to 1e-13. The sums of Breslow and Day, Tarone, Sato, and
# Greenland and Robins, and the quadratic forms of Landis, Heyman and Koch are written out anew.
# Run from the repository's root: Rscript tests/reference-values/scripts/stratified-methods.R [output folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20251203)

numbers <- function(x) array_of(number(unname(x)))
rows_of <- function(m) array_of(apply(m, 1, numbers))
root <- function(f, range = c(-25, 25)) uniroot(f, range, tol = 1e-15, maxiter = 10000)$root
z <- qnorm(0.975)

# A row per stratum: events and total of the index group, events and total of the reference group.
random_strata <- function(k, smallest, largest) {
  t(sapply(seq_len(k), function(i) {
    n <- round(exp(runif(2, log(smallest), log(largest))))
    base <- runif(1, 0.15, 0.6)
    x <- pmin(n - 1, pmax(1, rbinom(2, n, c(min(0.9, base * 1.4), base))))
    c(x[1], n[1], x[2], n[2])
  }))
}
cube_of <- function(s) array(apply(s, 1, function(t) c(t[1], t[3], t[2] - t[1], t[4] - t[3])),
  c(2, 2, nrow(s)))

# The index groups' events given all margins at log odds ratio 0: values and log probabilities.
conditional <- function(s) {
  weights <- 1
  least <- 0
  for (i in seq_len(nrow(s))) {
    t <- s[i, ]
    events <- t[1] + t[3]
    support <- max(0, events - t[4]):min(t[2], events)
    one <- dhyper(support, t[2], t[4], events)
    sums <- numeric(length(weights) + length(one) - 1)
    for (j in seq_along(one)) {
      at <- j:(j + length(weights) - 1)
      sums[at] <- sums[at] + one[j] * weights
    }
    weights <- sums
    least <- least + support[1]
  }
  list(x = least + seq_along(weights) - 1, log = log(weights))
}

common_odds_ratio <- function(s) {
  sum <- conditional(s)
  observed <- sum(s[, 1])
  p <- function(t) {
    w <- sum$log + sum$x * t
    w <- exp(w - max(w))
    w / sum(w)
  }
  upper <- function(t, share) sum(p(t)[sum$x > observed]) + share * sum(p(t)[sum$x == observed])
  lower <- function(t, share) sum(p(t)[sum$x < observed]) + share * sum(p(t)[sum$x == observed])
  limits <- function(share) {
    c(if (observed == min(sum$x)) 0 else exp(root(function(t) upper(t, share) - 0.025)),
      exp(root(function(t) lower(t, share) - 0.025)))
  }
  value <- if (observed == min(sum$x)) 0 else exp(root(function(t) sum(p(t) * sum$x) - observed))
  list(value = value, exact = limits(1), mid = limits(0.5))
}

conditional_case <- function(s) {
  own <- common_odds_ratio(s)
  fields <- c(field("kind", text("conditional")), field("strata", rows_of(s)),
    field("value", number(own$value)), field("exact", numbers(own$exact)),
    field("midP", numbers(own$mid)))
  if (nrow(s) > 1) {
    printed <- mantelhaen.test(cube_of(s), exact = TRUE)
    fields <- c(fields, field("mantelhaenTest", numbers(c(printed$estimate, printed$conf.int))))
  }
  object(fields)
}

breslow_day <- function(s) {
  a <- s[, 1]; n1 <- s[, 2]; m1 <- s[, 1] + s[, 3]; n0 <- s[, 4]; n <- n1 + n0
  psi <- sum(a * (n0 - s[, 3]) / n) / sum((n1 - a) * s[, 3] / n)
  expected <- sapply(seq_along(a), function(i) {
    ends <- c(max(0, m1[i] - n0[i]), min(n1[i], m1[i]))
    root(function(e) e * (n0[i] - m1[i] + e) - psi * (n1[i] - e) * (m1[i] - e), ends)
  })
  variance <- 1 / (1 / expected + 1 / (n1 - expected) + 1 / (m1 - expected) +
    1 / (n0 - m1 + expected))
  plain <- sum((a - expected)^2 / variance)
  c(plain, plain - sum(a - expected)^2 / sum(variance))
}

homogeneity_case <- function(s) {
  cells <- cbind(s[, 1], s[, 2] - s[, 1], s[, 3], s[, 4] - s[, 3])
  ratio <- log(cells[, 1] * cells[, 4] / (cells[, 2] * cells[, 3]))
  fit <- lm(ratio ~ 1, weights = 1 / rowSums(1 / cells))
  woolf <- sum(weights(fit) * residuals(fit)^2)
  df <- nrow(s) - 1
  with_p <- function(x) numbers(c(x, pchisq(x, df, lower.tail = FALSE)))
  both <- breslow_day(s)
  object(field("kind", text("homogeneity")), field("strata", rows_of(s)),
    field("breslowDay", with_p(both[1])), field("breslowDayTarone", with_p(both[2])),
    field("woolf", with_p(woolf)))
}

pooled_case <- function(s) {
  a <- s[, 1]; n1 <- s[, 2]; c0 <- s[, 3]; n0 <- s[, 4]; n <- n1 + n0; m1 <- a + c0
  w <- n1 * n0 / n
  rd <- sum((a * n0 - c0 * n1) / n) / sum(w)
  p <- (n1^2 * c0 - n0^2 * a + n1 * n0 * (n0 - n1) / 2) / n^2
  q <- (a * (n0 - c0) + c0 * (n1 - a)) / (2 * n)
  sato <- (rd * sum(p) + sum(q)) / sum(w)^2
  greenland <- sum((a * (n1 - a) * n0^3 + c0 * (n0 - c0) * n1^3) / (n1 * n0 * n^2)) / sum(w)^2
  top <- sum(a * n0 / n)
  bottom <- sum(c0 * n1 / n)
  spread <- sqrt(sum((n1 * n0 * m1 - a * c0 * n) / n^2) / (top * bottom))
  object(field("kind", text("pooled")), field("strata", rows_of(s)),
    field("sato", numbers(rd + c(0, -z, z) * sqrt(sato))),
    field("greenlandRobins", numbers(rd + c(0, -z, z) * sqrt(greenland))),
    field("riskRatio", numbers(exp(log(top / bottom) + c(0, -z, z) * spread))))
}

random_tables <- function(r, k, strata) {
  array(rpois(r * k * strata, rep(exp(runif(strata, 0.5, 3.5)), each = r * k)), c(r, k, strata))
}

quadratic <- function(cube, contrast) {
  deviation <- 0
  spread <- 0
  for (i in seq_len(dim(cube)[3])) {
    m <- cube[, , i]
    n <- sum(m)
    rows <- rowSums(m)
    columns <- colSums(m)
    cov <- (kronecker(diag(columns) * n - outer(columns, columns),
      diag(rows) * n - outer(rows, rows))) / (n^2 * (n - 1))
    deviation <- deviation + contrast %*% as.vector(m - outer(rows, columns) / n)
    spread <- spread + contrast %*% cov %*% t(contrast)
  }
  value <- as.vector(t(deviation) %*% solve(spread, deviation))
  df <- nrow(contrast)
  numbers(c(value, df, pchisq(value, df, lower.tail = FALSE)))
}

generalised_case <- function(cube, row_scores, column_scores) {
  plain <- mantelhaen.test(cube, correct = FALSE)
  r <- dim(cube)[1]
  some_rows <- diag(r)[-r, , drop = FALSE]
  tables <- array_of(apply(cube, 3, rows_of))
  object(field("kind", text("generalised")), field("tables", tables),
    field("rowScores", numbers(row_scores)), field("columnScores", numbers(column_scores)),
    field("generalAssociation", numbers(c(plain$statistic, plain$parameter, plain$p.value))),
    field("rowMeanScores", quadratic(cube, kronecker(t(column_scores), some_rows))),
    field("scoreCorrelation", quadratic(cube, kronecker(t(column_scores), t(row_scores)))))
}

# One table: the mean scores' test is (N - 1) times R squared of an analysis of variance.
single_case <- function(m, row_scores, column_scores) {
  cells <- expand.grid(row = seq_len(nrow(m)), column = seq_len(ncol(m)))
  one <- cells[rep(seq_len(nrow(cells)), as.vector(m)), ]
  y <- column_scores[one$column]
  means <- summary(lm(y ~ factor(one$row)))$r.squared * (nrow(one) - 1)
  correlation <- cor(row_scores[one$row], y)^2 * (nrow(one) - 1)
  pearson <- suppressWarnings(chisq.test(m, correct = FALSE))
  general <- unname(pearson$statistic) * (nrow(one) - 1) / nrow(one)
  with_p <- function(x, df) numbers(c(x, df, pchisq(x, df, lower.tail = FALSE)))
  object(field("kind", text("generalised")), field("tables", array_of(rows_of(m))),
    field("rowScores", numbers(row_scores)), field("columnScores", numbers(column_scores)),
    field("generalAssociation", with_p(general, unname(pearson$parameter))),
    field("rowMeanScores", with_p(means, nrow(m) - 1)),
    field("scoreCorrelation", with_p(correlation, 1)))
}

long <- function(s) data.frame(x = c(s[, 1], s[, 3]), n = c(s[, 2], s[, 4]),
  group = rep(1:0, each = nrow(s)), stratum = factor(rep(seq_len(nrow(s)), 2)))

saturated <- function(d, link) {
  start <- if (link == "logit") NULL else {
    full <- model.matrix(~ stratum * group, d)
    solve(full, if (link == "log") log(d$x / d$n) else d$x / d$n)
  }
  suppressWarnings(glm(cbind(x, n - x) ~ stratum * group, data = d, family = binomial(link),
    start = start, control = glm.control(epsilon = 1e-15, maxit = 200)))
}

standardised_case <- function(s, shares) {
  d <- long(s)
  fit <- saturated(d, "identity")
  full <- model.matrix(fit)
  w <- shares / sum(shares)
  index <- as.vector(t(full[d$group == 1, ]) %*% w)
  reference <- as.vector(t(full[d$group == 0, ]) %*% w)
  beta <- coef(fit)
  v <- vcov(fit)
  linear <- function(l) sum(l * beta) + c(0, -z, z) * sqrt(as.vector(t(l) %*% v %*% l))
  risks <- c(sum(index * beta), sum(reference * beta))
  slope <- index / risks[1] - reference / risks[2]
  ratio <- exp(log(risks[1] / risks[2]) + c(0, -z, z) * sqrt(as.vector(t(slope) %*% v %*% slope)))
  object(field("kind", text("standardised")), field("strata", rows_of(s)),
    field("shares", numbers(shares)), field("index", numbers(linear(index))),
    field("reference", numbers(linear(reference))),
    field("difference", numbers(linear(index - reference))), field("ratio", numbers(ratio)))
}

last_term <- function(fit, exponentiate) {
  b <- coef(fit)[4]
  se <- sqrt(vcov(fit)[4, 4])
  limits <- b + c(0, -z, z) * se
  numbers(c(if (exponentiate) exp(limits) else limits, (b / se)^2,
    pchisq((b / se)^2, 1, lower.tail = FALSE)))
}

wilson <- function(x, n) suppressWarnings(prop.test(x, n, correct = FALSE))$conf.int

newcombe <- function(t) {
  p <- c(t[1] / t[2], t[3] / t[4])
  one <- wilson(t[1], t[2])
  other <- wilson(t[3], t[4])
  c(p[1] - p[2] - sqrt((p[1] - one[1])^2 + (other[2] - p[2])^2),
    p[1] - p[2] + sqrt((one[2] - p[1])^2 + (p[2] - other[1])^2))
}

square_and_add <- function(s) {
  d <- s[, 1] / s[, 2] - s[, 3] / s[, 4]
  one <- newcombe(s[1, ])
  other <- newcombe(s[2, ])
  value <- d[1] - d[2]
  c(value, value - sqrt((d[1] - one[1])^2 + (other[2] - d[2])^2),
    value + sqrt((one[2] - d[1])^2 + (d[2] - other[1])^2))
}

interaction_case <- function(s) {
  d <- long(s[2:1, ])
  object(field("kind", text("interaction")), field("strata", rows_of(s)),
    field("riskRatio", last_term(saturated(d, "log"), TRUE)),
    field("oddsRatio", last_term(saturated(d, "logit"), TRUE)),
    field("wald", last_term(saturated(d, "identity"), FALSE)),
    field("squareAndAdd", numbers(square_and_add(s))))
}

# Rows: both, first only, second only, neither; events and totals.
excess_case <- function(m) {
  group <- factor(c("both", "first", "second", "a"), levels = c("a", "both", "first", "second"))
  excess <- function(link) {
    start <- if (link == "log") {
      logs <- log(m[, 1] / m[, 2])
      c(logs[4], logs[1:3] - logs[4])
    }
    fit <- suppressWarnings(glm(cbind(m[, 1], m[, 2] - m[, 1]) ~ group, family = binomial(link),
      start = start, control = glm.control(epsilon = 1e-15, maxit = 200)))
    ratios <- exp(coef(fit)[-1])
    slope <- c(0, ratios * c(1, -1, -1))
    value <- sum(ratios * c(1, -1, -1)) + 1
    se <- sqrt(as.vector(t(slope) %*% vcov(fit) %*% slope))
    numbers(c(value + c(0, -z, z) * se, (value / se)^2,
      pchisq((value / se)^2, 1, lower.tail = FALSE)))
  }
  object(field("kind", text("excess")), field("groups", rows_of(m)),
    field("riskRatios", excess("log")), field("oddsRatios", excess("logit")))
}

rabbits <- matrix(c(0, 6, 0, 5, 3, 6, 0, 6, 6, 6, 2, 6, 5, 6, 6, 6, 2, 2, 5, 5), ncol = 4,
  byrow = TRUE)
few <- matrix(c(0, 12, 3, 14, 0, 9, 1, 11), ncol = 4, byrow = TRUE)
satisfaction <- array(c(1, 2, 0, 0, 3, 3, 1, 2, 11, 17, 8, 4, 2, 3, 5, 2, 1, 0, 0, 0, 1, 3, 0, 1,
  2, 5, 7, 9, 1, 1, 3, 6), c(4, 4, 2))
cases <- c(
  lapply(list(rabbits, few), conditional_case),
  lapply(c(1, 1, 2, 3, 5, 10, 20), function(k) conditional_case(random_strata(k, 5, 80))),
  list(conditional_case(random_strata(50, 10, 60))),
  lapply(c(2, 3, 5, 8, 15), function(k) homogeneity_case(random_strata(k, 10, 500))),
  lapply(c(1, 2, 4, 8, 20), function(k) pooled_case(random_strata(k, 8, 900))),
  list(generalised_case(satisfaction, c(3, 10, 20, 35), c(1, 3, 4, 5)),
    generalised_case(random_tables(3, 2, 4), c(1, 2, 3), c(0, 1)),
    generalised_case(random_tables(2, 4, 3), c(0, 1), c(1, 2, 3, 5)),
    generalised_case(random_tables(5, 3, 6), c(0, 0.5, 1.5, 4, 7), c(-1, 0, 2)),
    single_case(random_tables(4, 3, 1)[, , 1] + 1, c(1, 2, 3, 4), c(1, 2, 4)),
    single_case(random_tables(6, 2, 1)[, , 1] + 1, 1:6, c(0, 1))),
  lapply(c(2, 3, 4, 7), function(k) standardised_case(random_strata(k, 30, 900), sample(1:400, k))),
  lapply(1:4, function(i) interaction_case(random_strata(2, 30, 900))),
  list(excess_case(matrix(c(225, 391, 6, 18, 8, 26, 3, 23), ncol = 2, byrow = TRUE)),
    excess_case(matrix(c(40, 200, 30, 300, 25, 260, 20, 400), ncol = 2, byrow = TRUE))))

write_lines(file.path(folder, "stratified-methods.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/stratified-methods.R"))), unlist(cases))
