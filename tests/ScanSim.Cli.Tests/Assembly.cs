using ScanSim.Testing;

[assembly: AssemblyFixture(typeof(ValidationPage))]
