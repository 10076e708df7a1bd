# The strings that tables print, from counts to digits: standing examples, and the demonstration
# files as base R reads and tabulates them. Wilson by prop.test, Mantel-Haenszel odds ratios by
# mantelhaen.test, trends by prop.trend.test, the model by glm; the rest is written out. Rounding is
# half away from zero: shares and differences of counts by whole numbers, others at 12 digits. The
# rules of digits are those that the house styles state, written anew.
# Run from the repository's root: Rscript tests/reference-values/scripts/displayed-strings.R [folder]
source("tests/reference-values/scripts/json.R")
arguments <- commandArgs(trailingOnly = TRUE)
folder <- if (length(arguments) > 0) arguments[1] else "tests/reference-values"
z <- qnorm(0.975)

styles <- list(
  "open-clinical" = list(between = " to ", brackets = c("(", ")"), 
    steps = c(0, 200), scale = 100, fewer = 0, ratio = 2, small = 0,
    zero = TRUE, p = cbind(c(0.2, 1), c(3, 2)), floor = 0.001, ceiling = 0.99, group = 1e9),
  "compact-clinical" = list(between = "-", brackets = c("(", ")"), 
    steps = c(0, 100), scale = 100, fewer = 0, ratio = 2, small = 0,
    zero = FALSE, p = cbind(c(0.01, 1), c(3, 2)), floor = 0.001, ceiling = 0.99, group = 1e9),
  "bracketed-social-health" = list(between = ", ", brackets = c("[", "]"), 
    steps = c(0, 100), scale = 100, fewer = 0, ratio = 2, small = 0,
    zero = FALSE, p = cbind(c(0.1, 1), c(3, 2)), floor = 0.001, ceiling = 0.99, group = 1000),
  "public-bulletin" = list(between = " to ", brackets = c("(", ")"), 
    steps = 0, scale = 1000, fewer = 1, ratio = 1, small = 0.1,
    zero = TRUE, p = cbind(1, 2), floor = 0.01, ceiling = 0.9, group = 1000))

# Whole units of the last digit, as text with a point.
digits <- function(units, places, sign = "") {
  body <- formatC(units, format = "f", digits = 0)
  if (places > 0) {
    body <- formatC(body, width = places + 1, flag = "0")
    body <- gsub(" ", "0", body)
    body <- paste0(substr(body, 1, nchar(body) - places), ".",
      substr(body, nchar(body) - places + 1, nchar(body)))
  }
  paste0(if (units == 0) "" else sign, body)
}
sign_of <- function(x, signed) if (x < 0) "-" else if (signed && x > 0) "+" else ""
units_of <- function(x, scale, places) floor(signif(abs(x) * scale * 10^places, 12) + 0.5)
real <- function(x, scale, places, signed = FALSE) {
  digits(units_of(x, scale, places), places, sign_of(x, signed))
}
fraction <- function(top, bottom, scale, places, signed = FALSE) {
  size <- abs(top) * scale * 10^places
  whole <- size %/% bottom
  digits(whole + (2 * (size - whole * bottom) >= bottom), places, sign_of(top, signed))
}
count <- function(n, style) if (n >= style$group) prettyNum(n, big.mark = ",") else as.character(n)
p_text <- function(p, style) {
  point <- function(text) if (style$zero) text else sub("^0", "", text)
  if (p < style$floor) return(paste0("<", point(format(style$floor))))
  if (p > style$ceiling) return(paste0(">", point(format(style$ceiling))))
  places <- style$p[style$p[, 1] > p, 2][1]
  while ((units_of(p, 1, places) / 10^places < 0.05) != (p < 0.05)) places <- places + 1
  point(real(p, 1, places))
}

# An estimate with its limits; no dash stands beside a minus sign.
cell <- function(values, style) {
  minus <- any(startsWith(values[2:3], "-"))
  between <- if (style$between == "-" && minus) " to " else style$between
  paste0(values[1], " ", style$brackets[1], values[2], between, values[3], style$brackets[2])
}

# Each comparison t: events and total of the index group, events and total of the reference.
wilson <- function(x, n) as.numeric(suppressWarnings(prop.test(x, n, correct = FALSE))$conf.int)
difference_of <- function(t) {
  w <- c(wilson(t[1], t[2]), wilson(t[3], t[4]))
  p <- t[1] / t[2]
  r <- t[3] / t[4]
  c(p - r, p - r - sqrt((p - w[1])^2 + (w[4] - r)^2), p - r + sqrt((w[2] - p)^2 + (r - w[3])^2))
}
ratio_of <- function(t) {
  ratio <- (t[1] / t[2]) / (t[3] / t[4])
  ratio * exp(c(0, -z, z) * sqrt(1 / t[1] - 1 / t[2] + 1 / t[3] - 1 / t[4]))
}
odds_of <- function(t) {
  cells <- c(t[1], t[2] - t[1], t[3], t[4] - t[3])
  cells[1] * cells[4] / cells[2] / cells[3] * exp(c(0, -z, z) * sqrt(sum(1 / cells)))
}
# Over strata: a matrix with a comparison in each row.
pooled_difference <- function(s) {
  size <- s[, 2] + s[, 4]
  weight <- sum(s[, 2] * s[, 4] / size)
  value <- sum((s[, 1] * s[, 4] - s[, 3] * s[, 2]) / size) / weight
  p <- (s[, 2]^2 * s[, 3] - s[, 4]^2 * s[, 1] + s[, 2] * s[, 4] * (s[, 4] - s[, 2]) / 2) / size^2
  q <- (s[, 1] * (s[, 4] - s[, 3]) + s[, 3] * (s[, 2] - s[, 1])) / 2 / size
  value + c(0, -z, z) * sqrt(value * sum(p) + sum(q)) / weight
}
pooled_ratio <- function(s) {
  size <- s[, 2] + s[, 4]
  top <- sum(s[, 1] * s[, 4] / size)
  bottom <- sum(s[, 3] * s[, 2] / size)
  spread <- sum(((s[, 1] + s[, 3]) * s[, 2] * s[, 4] - s[, 1] * s[, 3] * size) / size^2)
  top / bottom * exp(c(0, -z, z) * sqrt(spread / top / bottom))
}
mantelhaen_of <- function(s) {
  cells <- apply(s, 1, function(t) c(t[1], t[3], t[2] - t[1], t[4] - t[3]))
  mantelhaen.test(array(cells, c(2, 2, nrow(s))), correct = FALSE)
}
pooled_odds <- function(s) {
  test <- mantelhaen_of(s)
  c(test$estimate, test$conf.int)
}
q_test <- function(values, variances) {
  mean <- sum(values / variances) / sum(1 / variances)
  pchisq(sum((values - mean)^2 / variances), length(values) - 1, lower.tail = FALSE)
}
tarone <- function(s) {
  ratio <- pooled_odds(s)[1]
  fits <- apply(s, 1, function(t) {
    m <- t[1] + t[3]
    low <- max(0, m - t[4])
    a <- uniroot(function(a) a * (t[4] - m + a) - ratio * (t[2] - a) * (m - a),
      c(low, min(t[2], m)), tol = 1e-13)$root
    c(t[1] - a, 1 / (1 / a + 1 / (t[2] - a) + 1 / (m - a) + 1 / (t[4] - m + a)))
  })
  statistic <- sum(fits[1, ]^2 / fits[2, ]) - sum(fits[1, ])^2 / sum(fits[2, ])
  pchisq(statistic, nrow(s) - 1, lower.tail = FALSE)
}
homogeneity <- list(
  riskDifference = function(s) q_test(s[, 1] / s[, 2] - s[, 3] / s[, 4],
    s[, 1] * (s[, 2] - s[, 1]) / s[, 2]^3 + s[, 3] * (s[, 4] - s[, 3]) / s[, 4]^3),
  riskRatio = function(s) q_test(log(s[, 1] / s[, 2] / s[, 3] * s[, 4]),
    1 / s[, 1] - 1 / s[, 2] + 1 / s[, 3] - 1 / s[, 4]),
  oddsRatio = tarone)
measures <- list(riskDifference = difference_of, riskRatio = ratio_of, oddsRatio = odds_of)
pooled <- list(riskDifference = pooled_difference, riskRatio = pooled_ratio, oddsRatio = pooled_odds)

# Digits of a column: shares by the votes of the groups, more where a limit would print as no effect.
percent_places <- function(groups, style) {
  shown <- groups[groups[, 2] >= 20, , drop = FALSE]
  votes <- table(sapply(shown[, 2], function(n) sum(n >= style$steps) - 1))
  places <- as.numeric(names(votes)[which.max(votes)])
  places + any(shown[, 1] > 0 & shown[, 1] / shown[, 2] < style$small)
}
off_null <- function(limits, null, scale, places) {
  meets <- function(p) any(units_of(limits, scale, p) == null * scale * 10^p)
  most <- places + 2
  while (places < most && meets(places)) places <- places + 1
  places
}

# A layer is a matrix with a level in each row, events and total; the first is the reference.
analysis_case <- function(name, style_id, layers, design, ids) {
  style <- styles[[style_id]]
  crude <- Reduce(`+`, layers)
  stratified <- length(layers) > 1
  scopes <- c(list(crude), if (stratified) layers)
  names(scopes) <- c("crude", if (stratified) paste0("stratum:", names(layers)))
  cases <- design == "caseControl"
  used <- if (cases) "oddsRatio" else c("riskDifference", "riskRatio")
  contrast <- function(m, level) c(m[level, ], m[1, ])
  others <- seq_along(ids)[-1]
  strata_of <- function(level) t(sapply(layers, contrast, level = level))
  shares <- function(m) if (cases) {
    rbind(cbind(m[, 1], sum(m[, 1])), cbind(m[, 2] - m[, 1], sum(m[, 2] - m[, 1])))
  } else m
  places <- percent_places(do.call(rbind, lapply(scopes, shares)), style)
  out <- character()
  put <- function(quantity, level, scope, facet, value) {
    out[paste(quantity, level, scope, facet, sep = "/")] <<- value
  }
  put("counted", "@all", "crude", "value", count(sum(crude[, 2]), style))
  for (scope in names(scopes)) {
    m <- scopes[[scope]]
    controls <- m[, 2] - m[, 1]
    put("events", "@all", scope, "value", count(sum(m[, 1]), style))
    put("total", "@all", scope, "value", count(sum(m[, 2]), style))
    put("controls", "@all", scope, "value", count(sum(controls), style))
    for (i in seq_along(ids)) {
      put("events", ids[i], scope, "value", count(m[i, 1], style))
      put("total", ids[i], scope, "value", count(m[i, 2], style))
      put("controls", ids[i], scope, "value", count(controls[i], style))
      if (cases) {
        put("shareOfCases", ids[i], scope, "value", fraction(m[i, 1], sum(m[, 1]), 100, places))
        put("shareOfControls", ids[i], scope, "value",
          fraction(controls[i], sum(controls), 100, places))
        of <- c(m[i, 1] + m[1, 1], controls[i] + controls[1])
        put("comparedCases", ids[i], scope, "value", count(of[1], style))
        put("comparedControls", ids[i], scope, "value", count(of[2], style))
        put("shareOfComparedCases", ids[i], scope, "value",
          fraction(m[i, 1], of[1], 100, places))
        put("shareOfComparedControls", ids[i], scope, "value",
          fraction(controls[i], of[2], 100, places))
      } else put("risk", ids[i], scope, "value", fraction(m[i, 1], m[i, 2], 100, places))
    }
    if (length(ids) > 2) put("trend", "@all", scope, "pValue",
      p_text(prop.trend.test(m[, 1], m[, 2], seq_along(ids))$p.value, style))
  }
  for (measure in used) {
    estimates <- list()
    for (level in others) {
      for (scope in names(scopes)) {
        estimates[[paste(ids[level], scope, sep = "/")]] <-
          measures[[measure]](contrast(scopes[[scope]], level))
      }
      if (stratified) estimates[[paste(ids[level], "pooled", sep = "/")]] <-
        pooled[[measure]](strata_of(level))
    }
    is_difference <- measure == "riskDifference"
    scale <- if (is_difference) style$scale else 1
    fewest <- if (is_difference) max(0, places - style$fewer) else style$ratio
    limits <- unlist(lapply(estimates, function(e) e[2:3]))
    column <- off_null(limits, if (is_difference) 0 else 1, scale, fewest)
    for (key in names(estimates)) {
      e <- estimates[[key]]
      values <- sapply(e, real, scale = scale, places = column)
      if (is_difference) values[1] <- real(e[1], scale, column, TRUE)
      at <- strsplit(key, "/")[[1]]
      if (is_difference && at[2] != "pooled") {
        t <- contrast(scopes[[at[2]]], match(at[1], ids))
        values[1] <- fraction(t[1] * t[4] - t[3] * t[2], t[2] * t[4], scale, column, TRUE)
      }
      mapply(function(facet, value) put(measure, at[1], at[2], facet, value),
        c("value", "lower", "upper"), values)
      put(measure, at[1], at[2], "cell", cell(values, style))
    }
    if (stratified) for (level in others) put(paste0("homogeneity:", measure), ids[level], "pooled",
      "pValue", p_text(homogeneity[[measure]](strata_of(level)), style))
  }
  if (stratified) for (level in others) put("conditionalIndependence", ids[level], "pooled",
    "pValue", p_text(mantelhaen_of(strata_of(level))$p.value, style))
  if (length(ids) == 2 && !stratified) {
    p <- chisq.test(cbind(crude[, 1], crude[, 2] - crude[, 1]), correct = FALSE)$p.value
    for (facet in c("pValue", "cell")) put("pearson", ids[2], "crude", facet, p_text(p, style))
  }
  strings <- object(mapply(field, names(out), text(out)))
  head <- c(field("kind", text("table")), field("name", text(name)),
    field("style", text(style_id)), field("printed", strings))
  object(head, if (design == "trial" || name == "night work")
    field("needed", array_of(text(needed(crude)))))
}

# 1 / difference: up, limits outwards; through infinity the smaller count of either direction.
needed <- function(m) {
  d <- difference_of(c(m[2, ], m[1, ]))
  inverse <- signif(1 / abs(d), 12)
  size <- abs(m[2, 1] * m[1, 2] - m[1, 1] * m[2, 2])
  value <- -((-m[2, 2] * m[1, 2]) %/% size)
  limits <- if (d[2] * d[3] < 0) floor(inverse[2:3]) else
    c(floor(min(inverse[2:3])), ceiling(max(inverse[2:3])))
  formatC(c(value, limits), format = "d")
}

examples <- list(
  list("night work", "cohort", c(84, 620, 58, 640)),
  list("balance training", "trial", c(96, 512, 126, 508)),
  list("lifting", "caseControl", c(142, 322, 68, 308)),
  list("screens", "crossSectional", c(312, 780, 208, 840)),
  list("reminders", "trial", c(31, 240, 36, 238)))
example_cases <- unlist(lapply(examples, function(one) {
  t <- one[[3]]
  layer <- list(rbind(t[3:4], t[1:2]))
  sapply(c("open-clinical", "compact-clinical"), function(style) {
    analysis_case(one[[1]], style, layer, one[[2]], c("reference", "index"))
  })
}))

slug <- function(x) gsub("^-|-$", "", gsub("[^a-z0-9]+", "-", tolower(x)))
read <- function(name) read.csv(file.path("seeds/data", name), colClasses = "character")
layers_of <- function(data, stratum, level, levels, events, total) {
  strata <- if (is.null(stratum)) rep("all", nrow(data)) else data[[stratum]]
  found <- lapply(unique(strata), function(s) t(sapply(levels, function(l) {
    rows <- strata == s & data[[level]] == l
    c(sum(events[rows]), sum(total[rows]))
  })))
  setNames(found, slug(unique(strata)))
}
records <- function(data, outcome, event) {
  list(as.numeric(data[[outcome]] == event), rep(1, nrow(data)))
}

staff <- read("wet-work-second-cut.csv")
staff <- staff[staff$workplace != "" & staff$wet_work %in% 0:4 & staff$eczema_12m != "", ]
ill <- records(staff, "eczema_12m", "1")
guests <- read("harbour-supper-guests.csv")
sick <- records(guests, "ill_72h", "ill")
clinics <- read("reminder-letters-by-clinic.csv")
opticians <- read("evening-screen-use.csv")
spectacles <- as.numeric(opticians$cases)
hours <- unique(opticians$evening_screen_hours)
letters_sent <- c("usual invitation", "reminder letter")
demonstrations <- c(
  analysis_case("Hand eczema by wet work, within workplace", "open-clinical",
    layers_of(staff, "workplace", "wet_work", 0:4, ill[[1]], ill[[2]]), "cohort", 0:4),
  analysis_case("Illness by fish pie, within sitting", "public-bulletin",
    layers_of(guests, "sitting", "fish_pie", c("no", "yes"), sick[[1]], sick[[2]]), "cohort",
    c("no", "yes")),
  analysis_case("Illness by mussels", "public-bulletin",
    layers_of(guests, NULL, "mussels", c("no", "yes"), sick[[1]], sick[[2]]), "cohort",
    c("no", "yes")),
  analysis_case("Illness by potato salad", "public-bulletin",
    layers_of(guests, NULL, "potato_salad", c("no", "yes"), sick[[1]], sick[[2]]), "cohort",
    c("no", "yes")),
  analysis_case("Uptake by letter, within clinic", "compact-clinical",
    layers_of(clinics, "clinic", "letter", letters_sent, as.numeric(clinics$attended),
      as.numeric(clinics$invited)), "cohort", slug(letters_sent)),
  analysis_case("New spectacles by evening screen use, within age", "bracketed-social-health",
    layers_of(opticians, "age_band", "evening_screen_hours", hours, spectacles,
      spectacles + as.numeric(opticians$controls)), "caseControl", slug(hours)))

fit <- summary(glm(as.numeric(eczema_12m) ~ wet_work + workplace + as.numeric(age_years), binomial,
  staff))$coefficients
models <- sapply(1:4, function(level) {
  row <- fit[paste0("wet_work", level), ]
  ratio <- exp(row[1] + c(0, -z, z) * row[2])
  p <- row[4]
  coarse <- if (p < 0.001) "<0.001" else real(p, 1, 2)
  object(field("kind", text("model")), field("level", text(level)),
    field("printed", array_of(text(c(sapply(ratio, real, scale = 1, places = 2), coarse)))),
    field("fine", array_of(text(c(sapply(ratio, real, scale = 1, places = 8),
      real(p, 1, 10))))))
})

write_lines(file.path(folder, "displayed-strings.json"),
  c(field("source", text(paste(R.version.string, "stats package"))),
    field("script", text("tests/reference-values/scripts/displayed-strings.R"))),
  c(example_cases, demonstrations, models))
