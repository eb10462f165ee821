namespace MemberScan.Part21.Containers;

/// <summary>Why a container is not read, in one sentence with the remedy.</summary>
internal sealed class RefusedContainer(string message) : Exception(message);
