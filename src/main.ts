// Joins the commands and the screens; the only place that catches.
console.log("joulewright");
