# Values of distribution functions, far tails included, by R's stats package.
# Run from the repository's root: Rscript tests/reference-values/scripts/distributions.R
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"

case_of <- function(name, arguments, expected) {
  object(field("function", text(name)), field("arguments", array_of(number(arguments))),
    field("expected", number(expected)))
}

probabilities <- c(1e-300, 1e-200, 1e-100, 1e-50, 1e-20, 1e-10, 1e-5, 0.0005, 0.005, 0.025, 0.05,
  0.1, 0.25, 0.4, 0.5, 0.6, 0.9, 0.975, 0.9995, 1 - 1e-10)
zs <- c(-37, -30, -20, -10, -6, -3, -1.5, -0.1, 0, 0.1, 1, 3, 6, 8)
chi <- expand.grid(x = c(1e-6, 0.01, 0.5, 1, 3.84, 10, 50, 200, 700, 1300, 1350),
  df = c(1, 2, 3, 4, 5, 9, 19, 57, 190))
chi$p <- pchisq(chi$x, chi$df, lower.tail = FALSE)
chi <- chi[chi$p > 1e-300, ]
shapes <- rbind(c(0.5, 20.5), c(0.5, 0.5), c(1, 30), c(15, 134), c(16, 133), c(13.5, 3.5),
  c(1198, 1494), c(1199, 1493), c(2, 1e6), c(1e5, 1e6), c(3e5, 7e6), c(250.5, 0.5))
tails <- c(1e-10, 0.0005, 0.005, 0.025, 0.1, 0.5, 0.9, 0.975, 0.9995)
betas <- expand.grid(i = seq_len(nrow(shapes)), p = tails)
urns <- rbind(c(4, 4, 4), c(13, 17, 12), c(50, 50, 40), c(500, 700, 300), c(20, 100000, 400),
  c(11034, 11037, 293), c(150000, 90000, 60000), c(3e6, 7e6, 2e6), c(5e6, 5e6, 40))
shares <- c(0, 0.1, 0.25, 0.45, 0.5, 0.55, 0.75, 0.9, 1)

cases <- c(
  mapply(function(p) case_of("normalQuantile", p, qnorm(p)), probabilities),
  mapply(function(z) case_of("normalCumulative", z, pnorm(z)), zs),
  mapply(function(z) case_of("normalUpperTail", z, pnorm(z, lower.tail = FALSE)), -zs),
  mapply(function(x, df, p) case_of("chiSquareUpperTail", c(x, df), p), chi$x, chi$df, chi$p),
  mapply(function(i, p) case_of("betaQuantile", c(p, shapes[i, ]),
    qbeta(p, shapes[i, 1], shapes[i, 2])), betas$i, betas$p),
  mapply(function(i, p) {
    x <- signif(qbeta(p, shapes[i, 1], shapes[i, 2]), 6)
    case_of("betaCumulative", c(x, shapes[i, ]), pbeta(x, shapes[i, 1], shapes[i, 2]))
  }, betas$i, betas$p),
  unlist(lapply(seq_len(nrow(urns)), function(i) {
    urn <- urns[i, ]
    least <- max(0, urn[3] - urn[2])
    most <- min(urn[1], urn[3])
    counts <- unique(round(least + shares * (most - least)))
    counts <- counts[dhyper(counts, urn[1], urn[2], urn[3]) > 1e-300]
    sapply(counts, function(k) case_of("hypergeometricProbability", c(k, urn),
      dhyper(k, urn[1], urn[2], urn[3])))
  })),
  sapply(c(0.1, 0.5, 1.5, 3, 10, 33, 100.5, 1e4, 1e7, 1e10), function(x)
    case_of("logGamma", x, lgamma(x)))
)

write_lines(file.path(folder, "distributions.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/distributions.R"))), cases)
