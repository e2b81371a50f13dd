pack { name = "quay-base", about = "Synthons for quay" }

synthon "quay alkyl" { kind = "acceptor", equivalents = { { attach = "Br" } } }
synthon "quay phenol" { kind = "donor", equivalents = { { attach = "[H]" } } }
