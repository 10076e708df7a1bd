# Writes numbers with 17 digits, so that no bit is lost; base R alone has no JSON.
number <- function(x) ifelse(is.na(x), "null", sprintf("%.17g", x))
array_of <- function(xs) paste0("[", paste(xs, collapse = ", "), "]")
field <- function(name, value) paste0("\"", name, "\": ", value)
object <- function(...) paste0("{ ", paste(c(...), collapse = ", "), " }")
text <- function(x) paste0("\"", x, "\"")
write_lines <- function(path, head, entries) {
  body <- paste0("    ", entries, collapse = ",\n")
  cat("{\n  ", paste(head, collapse = ",\n  "), ",\n  \"cases\": [\n", body, "\n  ]\n}\n",
    sep = "", file = path)
}
