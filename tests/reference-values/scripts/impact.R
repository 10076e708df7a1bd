# Measures of impact by R: the population attributable fraction with its variance by the delta method
# on a Poisson log-linear model, and the standard deviation that simulated populations show; fractions
# among the exposed and E-values as solutions of their defining equations.
# Run from the repository's root: Rscript tests/reference-values/scripts/impact.R [output folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
RNGkind("Mersenne-Twister", "Inversion", "Rejection")
set.seed(20251202)

numbers <- function(x) array_of(number(unname(x)))
log_rest <- function(cells) {
  log(cells[3]) - log(cells[3] + cells[4]) - log(cells[1] + cells[3]) + log(sum(cells))
}

# Variance of log(1 - AF) by numerical derivatives and the multinomial covariance of the cells.
delta_variance <- function(cells) {
  slopes <- sapply(1:4, function(i) {
    step <- cells[i] * 1e-5 + 1e-6
    up <- down <- cells
    up[i] <- up[i] + step
    down[i] <- down[i] - step
    (log_rest(up) - log_rest(down)) / (2 * step)
  })
  total <- sum(cells)
  sum(cells * slopes^2) - sum(cells * slopes)^2 / total
}

simulated_deviation <- function(cells, draws = 40000) {
  drawn <- rmultinom(draws, sum(cells), cells / sum(cells))
  values <- apply(drawn[, drawn[3, ] > 0], 2, log_rest)
  sd(values)
}

population_case <- function(cells, conf) {
  z <- qnorm(1 - (1 - conf) / 2)
  deviation <- sqrt(delta_variance(cells))
  rest <- exp(log_rest(cells) + c(0, z, -z) * deviation)
  fractions <- if (rest[1] > 1) 1 - 1 / rest[c(1, 3, 2)] else 1 - rest
  object(field("kind", text("population")), field("index", numbers(c(cells[1], cells[1] + cells[2]))),
    field("reference", numbers(c(cells[3], cells[3] + cells[4]))), field("level", number(conf)),
    field("reading", text(if (rest[1] > 1) "prevented" else "attributable")),
    field("fraction", numbers(fractions)), field("deviation", number(deviation)),
    field("simulatedDeviation", number(simulated_deviation(cells))))
}

# The E-value is where the bounding factor of two equal risk ratios reaches the observed one.
e_value <- function(ratio) {
  above <- max(ratio, 1 / ratio)
  if (above == 1) return(1)
  uniroot(function(e) e * e / (2 * e - 1) - above, c(1, 4 * above), tol = 1e-14)$root
}

e_value_case <- function(ratio) {
  nearer <- if (ratio[1] >= 1) ratio[2] else ratio[3]
  limit <- if (ratio[2] <= 1 && ratio[3] >= 1) 1 else e_value(nearer)
  object(field("kind", text("eValue")), field("ratio", numbers(ratio)),
    field("eValues", numbers(c(e_value(ratio[1]), limit))))
}

tables <- list(c(40, 160, 30, 270), c(397, 78557, 51, 108778), c(120, 80, 45, 155),
  c(12, 188, 60, 440), c(5, 45, 9, 91), c(90, 10, 60, 40), c(30, 970, 30, 970),
  c(210, 390, 75, 525), c(33, 17, 41, 209))
levels <- c(0.95, 0.9, 0.99)
ratios <- list(c(3.9, 1.8, 8.7), c(0.8, 0.71, 0.91), c(1.1, 0.9, 1.34), c(10.72978, 8.017457,
  14.359688), c(0.5, 0.2, 1.2), c(1, 1, 1), c(1.0001, 1.00005, 1.0002), c(250, 100, 700))

cases <- c(
  mapply(function(cells, i) population_case(cells, levels[1 + i %% 3]), tables, seq_along(tables)),
  sapply(ratios, e_value_case))
write_lines(file.path(folder, "impact.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/impact.R"))), unlist(cases))
