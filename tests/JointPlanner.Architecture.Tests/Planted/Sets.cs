namespace JointPlanner.Architecture.Tests.Planted.Sets;

/// <summary>Stands for the archive's context.</summary>
public sealed class Context
{
    private readonly List<object> rows = [];

    public IQueryable<string> Structures => Set<string>();

    public IQueryable<T> Set<T>() => rows.OfType<T>().AsQueryable();
}

/// <summary>Stands for what makes contexts.</summary>
public interface IFactory<out T>
{
    T Create();
}

/// <summary>Breaches for the search to find: a page that asks the database by itself.</summary>
public sealed class Page(IFactory<Context> factory)
{
    public int Counts() => Made().Structures.Count();

    public async Task<int> CountsAfterWaiting()
    {
        await Task.Yield();
        return Made().Set<int>().Count();
    }

    private Context Made() => factory.Create();
}
