.DEFAULT_GOAL := help
.PHONY: help start dev test check format accuracy kernel bench mutants seed migrate rollback backup restore stop clean

help: ## List every target
	@awk -F ':.*## ' '/^[a-z]+:.*## /{printf "  make %-10s %s\n", $$1, $$2}' Makefile

start: ## Set up what is missing and run the product on http://127.0.0.1:4680 (PORT=… for another)
	@exec node api/launch/start.js

dev: ## The same with the sources watched and the pages served by Vite on http://127.0.0.1:5173
	@exec node api/launch/dev.js

test: ## Everything: check, unit, database, API, pages, browser journey; closes with "N passed, N failed"
	@exec node test/run.js

check: ## Types, lint and format
	@exec node test/check.js

format: ## Write the format that check asks for
	@npx prettier --write --log-level warn .

accuracy: ## Every published test board against the method, as one table (WRITE=1 keeps it for the product)
	@exec node --import tsx test/accuracy/run.ts

kernel: ## Compile the kernel of core/numerics/kernel/assembly into kernel-binary.ts
	@exec node test/support/compile-kernel.js

bench: ## Time, memory and accuracy of the solver, as ratios against a reference in the same run
	@exec node --import tsx test/bench/run.ts

mutants: ## Plant faults in copies of the project and list which tests catch them (MUTANTS=pattern for some)
	@exec node --import tsx test/mutants/run.ts

seed: ## Load the demo team and assemblies into the local database; safe to repeat
	@exec node api/launch/local.js seed

migrate: ## Bring the local database to the newest state
	@exec node api/launch/local.js migrate

rollback: ## Take back the newest migration of the local database
	@exec node api/launch/local.js rollback

backup: ## Write the local database to a file (BACKUP=file for a name of your own)
	@exec node api/launch/local.js backup "$(BACKUP)"

restore: ## Replace the local database by a backup (BACKUP=file)
	@exec node api/launch/local.js restore "$(BACKUP)"

stop: ## End what runs from this folder, also what a killed start has left behind
	@exec node api/launch/local.js stop

clean: ## Remove what was built, and the local database with all that it holds (asks first; YES=1 answers)
	@exec node api/launch/local.js clean "$(YES)"
