# Intervals and tests of fourfold tables by R's stats package: binom.test and prop.test for risks,
# generalised linear models for differences and ratios, chisq.test and fisher.test.
# Run from the repository's root: Rscript tests/reference-values/scripts/fourfold.R
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20250611)

level <- function(i) c(0.95, 0.9, 0.99)[1 + i %% 3]
random_table <- function(i) {
  n <- round(exp(runif(2, log(4), log(if (i %% 5 == 0) 200000 else 900))))
  x <- rbinom(2, n, c(rbeta(1, 0.6, 0.9), rbeta(1, 0.6, 0.9)))
  c(x[1], n[1], x[2], n[2])
}
fixed <- list(c(5, 5, 0, 9), c(0, 12, 0, 30), c(7, 7, 11, 11), c(1, 2, 1, 2), c(3, 4, 1, 4),
  c(10, 20, 10, 20), c(1, 1000000, 3, 2000000), c(0, 1, 1, 1), c(6, 12, 6, 12), c(20, 40, 4, 40))
tables <- c(fixed, lapply(seq_len(40), random_table))

risk <- function(x, n, conf) {
  wilson <- suppressWarnings(prop.test(x, n, conf.level = conf, correct = FALSE))$conf.int
  exact <- binom.test(x, n, conf.level = conf)$conf.int
  object(field("wilson", array_of(number(wilson))),
    field("clopperPearson", array_of(number(exact))))
}

wald_by_glm <- function(t, conf, link) {
  response <- cbind(c(t[1], t[3]), c(t[2] - t[1], t[4] - t[3]))
  start <- switch(link, identity = c(t[3] / t[4], t[1] / t[2] - t[3] / t[4]),
    log = c(log(t[3] / t[4]), log(t[1] / t[2]) - log(t[3] / t[4])), NULL)
  fit <- suppressWarnings(glm(response ~ c(1, 0), family = binomial(link), start = start,
    control = glm.control(epsilon = 1e-14, maxit = 100)))
  limits <- confint.default(fit, level = conf)[2, ]
  if (link == "identity") limits else exp(limits)
}

case_of <- function(t, i) {
  conf <- level(i)
  cells <- c(t[1], t[2] - t[1], t[3], t[4] - t[3])
  inner <- all(cells > 0)
  m <- matrix(cells, 2, byrow = TRUE)
  tested <- all(colSums(m) > 0)
  chi <- if (tested) suppressWarnings(chisq.test(m, correct = FALSE)) else NULL
  object(
    field("index", array_of(number(t[1:2]))), field("reference", array_of(number(t[3:4]))),
    field("level", number(conf)),
    field("indexRisk", risk(t[1], t[2], conf)), field("referenceRisk", risk(t[3], t[4], conf)),
    if (inner) field("wald", array_of(number(wald_by_glm(t, conf, "identity")))),
    if (inner) field("katz", array_of(number(wald_by_glm(t, conf, "log")))),
    if (inner) field("woolf", array_of(number(wald_by_glm(t, conf, "logit")))),
    if (tested) field("pearson", array_of(number(c(chi$statistic, chi$p.value)))),
    if (tested) field("fisher", number(fisher.test(m)$p.value)))
}

write_lines(file.path(folder, "fourfold.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/fourfold.R"))),
  mapply(case_of, tables, seq_along(tables)))
